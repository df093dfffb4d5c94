import { chakra } from '@chakra-ui/react';
import { useState } from 'react';
import { useParams } from 'react-router-dom';
import { ButtonLink } from '../components/ButtonLink';
import { PageTitle } from '../components/PageTitle';
import { AuthSheet } from '../features/auth/components/AuthSheet';
import { LinkEnded } from '../features/auth/components/LinkEnded';
import { ResetForm } from '../features/auth/components/ResetForm';

const margin = [
  {
    title: 'Signed in elsewhere?',
    text: 'Every device is signed out when the new password is set. Sign in there again.',
  },
];

/** The link of the mail leads here: a new password, then sign in with it. */
export function ResetPage() {
  const { token = '' } = useParams();
  const [state, setState] = useState<'asking' | 'set' | 'ended'>('asking');
  if (state === 'ended')
    return (
      <LinkEnded>
        <PageTitle>This link has ended</PageTitle>
        <ButtonLink to="/forgot">Send a new link</ButtonLink>
      </LinkEnded>
    );
  if (state === 'set')
    return (
      <AuthSheet strong="Your new password is set." rest="Sign in with it." margin={margin}>
        <PageTitle>Your new password is set</PageTitle>
        <chakra.div role="status">
          <ButtonLink to="/sign-in">Sign in</ButtonLink>
        </chakra.div>
      </AuthSheet>
    );
  return (
    <AuthSheet strong="Set a new password." rest="Then your takes are open again." margin={margin}>
      <PageTitle>Set a new password</PageTitle>
      <ResetForm token={token} onSet={() => setState('set')} onEnded={() => setState('ended')} />
    </AuthSheet>
  );
}
