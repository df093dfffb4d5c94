import { chakra } from '@chakra-ui/react';
import { paths } from '@thudline/contracts';
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

const margin = [{ title: 'And the old one?', text: 'It signs in no more, and gets no more mail from here.' }];

const ended = ['link-ended', 'bad-request'];

/** The link of the mail leads here: the account has another address. */
export function NewAddressPage() {
  const { token = '' } = useParams();
  const { me } = useMe();
  const { verified, error, retry } = useVerification(token, paths.confirmEmail);
  if (error instanceof ApiError && ended.includes(error.code))
    return (
      <LinkEnded>
        <PageTitle>This link has ended</PageTitle>
        <ButtonLink to="/settings">Ask again from the settings</ButtonLink>
      </LinkEnded>
    );
  if (error)
    return (
      <PageMessage strong="The address was not changed." rest={error.message}>
        <Button onClick={retry}>Try again</Button>
      </PageMessage>
    );
  if (!verified) return <PageLoading />;
  return (
    <AuthSheet strong="Your address is the new one." rest="Sign in with it from now on." margin={margin}>
      <PageTitle>Your address is the new one</PageTitle>
      <chakra.div role="status">
        <ButtonLink to={me ? '/settings' : '/sign-in'}>{me ? 'Go to your settings' : 'Sign in'}</ButtonLink>
      </chakra.div>
    </AuthSheet>
  );
}
