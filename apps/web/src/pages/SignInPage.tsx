export function SignInPage() {
  return null;
}
