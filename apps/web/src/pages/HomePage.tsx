export function HomePage() {
  return null;
}
