import { useSearchParams } from 'react-router-dom';
import { ButtonLink } from '../components/ButtonLink';
import { PageTitle } from '../components/PageTitle';
import { TextLink } from '../components/TextLink';
import { AuthSheet } from '../features/auth/components/AuthSheet';
import { JoinForm } from '../features/auth/components/JoinForm';
import { useSignUp } from '../features/auth/hooks/useSignUp';

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
  const [search] = useSearchParams();
  const invitation = search.get('invitation') ?? undefined;
  const { needsInvitation } = useSignUp();
  if (needsInvitation && !invitation)
    return (
      <AuthSheet strong="By invitation." rest="Open the link of the mail that invites you." margin={margin}>
        <PageTitle>Join</PageTitle>
        <ButtonLink to="/sign-in" look="outline">
          Sign in
        </ButtonLink>
      </AuthSheet>
    );
  return (
    <AuthSheet strong="Join." rest="Your first sheet is a take away." margin={margin}>
      <PageTitle>Join</PageTitle>
      <JoinForm invitation={invitation} />
    </AuthSheet>
  );
}
