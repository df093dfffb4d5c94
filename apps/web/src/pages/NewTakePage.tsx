export function NewTakePage() {
  return null;
}
