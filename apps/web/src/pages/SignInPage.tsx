import { PageTitle } from '../components/PageTitle';
import { TextLink } from '../components/TextLink';
import { AuthSheet } from '../features/auth/components/AuthSheet';
import { SignInForm } from '../features/auth/components/SignInForm';

const margin = [
  {
    title: 'Somebody sent you a link?',
    text: 'Open it as it is. Reading and listening need no account.',
  },
  {
    title: 'Nothing recorded yet?',
    text: (
      <>
        <TextLink to="/sample">Read a sheet we made earlier</TextLink>. It can be heard and changed.
      </>
    ),
  },
];

export function SignInPage() {
  return (
    <AuthSheet strong="Sign in." rest="Your last take is where you left it." margin={margin}>
      <PageTitle>Sign in</PageTitle>
      <SignInForm />
    </AuthSheet>
  );
}
