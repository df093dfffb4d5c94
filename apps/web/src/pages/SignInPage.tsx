import { PageTitle } from '../components/PageTitle';
import { AuthSheet } from '../features/auth/components/AuthSheet';
import { SignInForm } from '../features/auth/components/SignInForm';

const margin = [
  {
    title: 'Nothing recorded yet?',
    text: 'A first take needs 45 seconds of playing: one microphone in the kick, one above the kit.',
  },
  { title: 'Who sees a take?', text: 'Nobody but you. Files are kept bit for bit and come back the same.' },
];

export function SignInPage() {
  return (
    <AuthSheet strong="Sign in." rest="Your last take is where you left it." margin={margin}>
      <PageTitle>Sign in</PageTitle>
      <SignInForm />
    </AuthSheet>
  );
}
