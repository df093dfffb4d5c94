import { Box, Flex } from '@chakra-ui/react';
import { changeEmailRequest, paths, type MeResponse } from '@thudline/contracts';
import { useState } from 'react';
import { TextButton } from '../../../components/Button';
import { PasswordField } from '../../../components/PasswordField';
import { FieldLabel } from '../../../components/TextField';
import { requestNothing } from '../../../lib/apiClient';
import { AuthForm } from '../../auth/components/AuthForm';
import { EmailField } from '../../auth/components/EmailField';
import { SubmitRow } from '../../auth/components/SubmitRow';
import { useAuthForm } from '../../auth/hooks/useAuthForm';
import { VerifiedWords } from './VerifiedWords';

/** The address as it is. */
export function EmailShown({ me, onChange }: { me: MeResponse; onChange: () => void }) {
  return (
    <Box minWidth={0}>
      <FieldLabel as="div">E-mail</FieldLabel>
      <Flex
        alignItems="center"
        justifyContent="space-between"
        gap="12px"
        minHeight="46px"
        paddingX="3px"
        borderBottom="2px solid"
        borderColor="rule"
        fontWeight={600}
        overflowWrap="anywhere"
      >
        <Box minWidth={0}>{me.email}</Box>
        <TextButton
          fontSize="small"
          fontWeight={400}
          color="ink.muted"
          minHeight="26px"
          aria-label="change the e-mail address"
          onClick={onChange}
        >
          change
        </TextButton>
      </Flex>
      <VerifiedWords verified={me.emailVerified} />
    </Box>
  );
}

/** Another address: it counts once the mail to it was opened. */
export function NewEmail({ onDone }: { onDone: () => void }) {
  const [sentTo, setSentTo] = useState('');
  if (sentTo)
    return (
      <Box role="status">
        A mail is on its way to <b>{sentTo}</b>. Your address changes when you open its link; until then it
        stays as it is. <TextButton onClick={onDone}>Good</TextButton>
      </Box>
    );
  return <EmailForm onSent={setSentTo} onLeave={onDone} />;
}

function EmailForm({ onSent, onLeave }: { onSent: (email: string) => void; onLeave: () => void }) {
  const { form, values, errors, formError, busy, set, submit } = useAuthForm({
    schema: changeEmailRequest,
    initial: { email: '', password: '' },
    send: async (body) => {
      await requestNothing(paths.changeEmail, { method: 'POST', body });
      onSent(body.email);
    },
    place: (error) =>
      error.code === 'email-taken' ? { email: error.message } : (error.details?.fields ?? null),
  });
  return (
    <AuthForm
      {...{ form, submit }}
      aria-label="Change the e-mail address"
      gap="14px"
      maxWidth="400px"
      onKeyDown={(event) => event.key === 'Escape' && !busy && onLeave()}
    >
      <EmailField value={values.email} onChange={(email) => set('email', email)} error={errors.email} />
      <PasswordField
        label="Your password"
        name="password"
        autoComplete="current-password"
        value={values.password}
        onChange={(text) => set('password', text)}
        error={errors.password}
      />
      <SubmitRow label="Send the mail" busyLabel="Sending…" busy={busy} error={formError}>
        <TextButton type="button" minHeight="44px" onClick={onLeave}>
          Leave it as it is
        </TextButton>
      </SubmitRow>
    </AuthForm>
  );
}
