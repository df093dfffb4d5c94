export function JoinPage() {
  return null;
}
