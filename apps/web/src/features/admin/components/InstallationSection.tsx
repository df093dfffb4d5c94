import { Box, chakra } from '@chakra-ui/react';
import { inviteRequest, signUps, type InstallationSettings } from '@thudline/contracts';
import { useState } from 'react';
import { FieldError } from '../../../components/FieldError';
import { InlineNumber } from '../../../components/InlineNumber';
import { InlineSelect } from '../../../components/InlineSelect';
import { AuthForm } from '../../auth/components/AuthForm';
import { EmailField } from '../../auth/components/EmailField';
import { SubmitRow } from '../../auth/components/SubmitRow';
import { useAuthForm } from '../../auth/hooks/useAuthForm';
import type { useInstallation } from '../hooks/useInstallation';
import { AdminSection } from './AdminSection';
import { TableState } from './AdminTable';

const bytesOfGb = 1e9;
const signUpWords = { open: 'anybody', invited: 'whoever is invited' } as const;

/** What holds for everybody, as a sentence that can be changed; and the way to invite somebody. */
export function InstallationSection({ installation }: { installation: ReturnType<typeof useInstallation> }) {
  const { settings, error, retry, refusal, set, invite } = installation;
  return (
    <AdminSection title="This installation">
      {!settings && (
        <TableState what="the settings" rows={undefined} error={error} onRetry={retry} empty="" />
      )}
      {settings && <Sentence {...{ settings }} onSet={(body) => void set(body)} />}
      {refusal && <FieldError>{refusal}</FieldError>}
      <Box maxWidth="400px" marginTop="14px">
        <InviteForm invite={invite} />
      </Box>
    </AdminSection>
  );
}

function Sentence({
  settings: { signUp, accountBytes },
  onSet,
}: {
  settings: InstallationSettings;
  onSet: (body: Partial<InstallationSettings>) => void;
}) {
  return (
    <chakra.p lineHeight={{ base: '40px', lg: '36px' }}>
      Here{' '}
      <InlineSelect
        label="Who may join"
        value={signUp}
        options={signUps}
        words={(option) => signUpWords[option]}
        onChange={(chosen) => onSet({ signUp: chosen })}
      />{' '}
      may join, and each account may keep{' '}
      <InlineNumber
        label="What each account may keep, GB"
        value={accountBytes / bytesOfGb}
        digits={1}
        step={1}
        min={0.1}
        max={100_000}
        unit="GB"
        whenLeft
        onChange={(gb) => onSet({ accountBytes: Math.round(gb * bytesOfGb) })}
      />
      .
    </chakra.p>
  );
}

function InviteForm({ invite }: { invite: (email: string) => Promise<void> }) {
  const [sentTo, setSentTo] = useState('');
  const { form, values, errors, formError, busy, set, submit } = useAuthForm({
    schema: inviteRequest,
    initial: { email: '' },
    send: async ({ email }) => {
      await invite(email);
      setSentTo(email);
      set('email', '');
    },
    place: (error) => ({ email: error.message }),
  });
  return (
    <AuthForm {...{ form, submit }} aria-label="Invite somebody">
      <EmailField value={values.email} onChange={(email) => set('email', email)} error={errors.email} />
      <SubmitRow label="Invite" busyLabel="Inviting…" busy={busy} error={formError}>
        <Box role="status" fontSize="small" color="ink.muted">
          {sentTo && `A mail is on its way to ${sentTo}.`}
        </Box>
      </SubmitRow>
    </AuthForm>
  );
}
