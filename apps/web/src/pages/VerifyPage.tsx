import { chakra } from '@chakra-ui/react';
import { useParams } from 'react-router-dom';
import { Button } from '../components/Button';
import { ButtonLink } from '../components/ButtonLink';
import { PageLoading } from '../components/PageLoading';
import { PageMessage } from '../components/PageMessage';
import { PageTitle } from '../components/PageTitle';
import { AuthSheet } from '../features/auth/components/AuthSheet';
import { LinkEnded } from '../features/auth/components/LinkEnded';
import { useVerification } from '../features/auth/hooks/useAccountLinks';
import { useMe } from '../features/auth/hooks/useMe';
import { ApiError } from '../lib/apiClient';

const margin = [
  { title: 'What for?', text: 'Mail that lets you back in goes to an address that is known to be yours.' },
];

/** The link of the mail leads here: the address is right. */
export function VerifyPage() {
  const { token = '' } = useParams();
  const { me } = useMe();
  const { verified, error, retry } = useVerification(token);
  if (error) return <NotVerified error={error} retry={retry} signedIn={Boolean(me)} />;
  if (!verified) return <PageLoading />;
  return (
    <AuthSheet strong="Your address is right." rest="That was all." margin={margin}>
      <PageTitle>Your address is right</PageTitle>
      <chakra.div role="status">
        <ButtonLink to={me ? '/takes' : '/sign-in'}>{me ? 'Go to your takes' : 'Sign in'}</ButtonLink>
      </chakra.div>
    </AuthSheet>
  );
}

function NotVerified({ error, retry, signedIn }: { error: Error; retry: () => void; signedIn: boolean }) {
  if (error instanceof ApiError && (error.code === 'link-ended' || error.code === 'bad-request'))
    return (
      <LinkEnded>
        <PageTitle>This link has ended</PageTitle>
        <ButtonLink to={signedIn ? '/settings' : '/sign-in'}>
          {signedIn ? 'Send a new one from the settings' : 'Sign in to send a new one'}
        </ButtonLink>
      </LinkEnded>
    );
  return (
    <PageMessage strong="The address could not be confirmed." rest={error.message}>
      <Button onClick={retry}>Try again</Button>
    </PageMessage>
  );
}
