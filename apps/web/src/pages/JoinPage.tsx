import { PageTitle } from '../components/PageTitle';
import { TextLink } from '../components/TextLink';
import { AuthSheet } from '../features/auth/components/AuthSheet';
import { JoinForm } from '../features/auth/components/JoinForm';

const margin = [
  {
    title: 'Been here before?',
    text: (
      <>
        <TextLink to="/sign-in">Sign in</TextLink>, and your takes are where you left them.
      </>
    ),
  },
  {
    title: 'What is kept?',
    text: 'Your name, your e-mail and your takes. Nobody hears a take but you and whom you send it to.',
  },
];

export function JoinPage() {
  return (
    <AuthSheet strong="Join." rest="Your first sheet is a take away." margin={margin}>
      <PageTitle>Join</PageTitle>
      <JoinForm />
    </AuthSheet>
  );
}
