import { Box } from '@chakra-ui/react';
import { changePasswordRequest } from '@thudline/contracts';
import { useState } from 'react';
import { TextButton } from '../../../components/Button';
import { PasswordField } from '../../../components/PasswordField';
import { AuthForm } from '../../auth/components/AuthForm';
import { SubmitRow } from '../../auth/components/SubmitRow';
import { useAccountLinks } from '../../auth/hooks/useAccountLinks';
import { useAuthForm } from '../../auth/hooks/useAuthForm';

/** A new password, against the old one. */
export function NewPassword({ onDone }: { onDone: () => void }) {
  const [set, setSet] = useState(false);
  if (set)
    return (
      <Box role="status">
        Your new password is set; other devices are signed out. <TextButton onClick={onDone}>Good</TextButton>
      </Box>
    );
  return <PasswordForm onSet={() => setSet(true)} onLeave={onDone} />;
}

function PasswordForm({ onSet, onLeave }: { onSet: () => void; onLeave: () => void }) {
  const { changePassword } = useAccountLinks();
  const { form, values, errors, formError, busy, set, submit } = useAuthForm({
    schema: changePasswordRequest,
    initial: { oldPassword: '', password: '' },
    send: async (body) => {
      await changePassword(body);
      onSet();
    },
    place: (error) => error.details?.fields ?? null,
  });
  return (
    <AuthForm
      {...{ form, submit }}
      aria-label="Set a new password"
      gap="14px"
      maxWidth="400px"
      onKeyDown={(event) => event.key === 'Escape' && !busy && onLeave()}
    >
      <PasswordField
        label="Password as it is"
        name="oldPassword"
        autoComplete="current-password"
        value={values.oldPassword}
        onChange={(text) => set('oldPassword', text)}
        error={errors.oldPassword}
      />
      <PasswordField
        label="New password"
        name="password"
        autoComplete="new-password"
        hint="At least 10 characters"
        value={values.password}
        onChange={(text) => set('password', text)}
        error={errors.password}
      />
      <SubmitRow label="Set it" busyLabel="Setting it…" busy={busy} error={formError}>
        <TextButton type="button" minHeight="44px" onClick={onLeave}>
          Leave it as it is
        </TextButton>
      </SubmitRow>
    </AuthForm>
  );
}
