export function TakesPage() {
  return null;
}
