import { chakra } from '@chakra-ui/react';
import { joinRequest } from '@thudline/contracts';
import { PasswordField } from '../../../components/PasswordField';
import { TextField } from '../../../components/TextField';
import { useAuthActions } from '../hooks/useAuthActions';
import { useAuthForm } from '../hooks/useAuthForm';
import { AuthForm } from './AuthForm';
import { EmailField } from './EmailField';
import { SubmitRow } from './SubmitRow';

/** @param invitation - from the mail that invited; undefined where nobody did */
export function JoinForm({ invitation }: { invitation?: string }) {
  const { join } = useAuthActions();
  const { form, values, errors, formError, busy, set, submit } = useAuthForm({
    schema: joinRequest,
    initial: { name: '', email: '', password: '' },
    send: (body) => join({ ...body, invitation }),
    place: (error) =>
      error.code === 'email-taken' ? { email: error.message } : (error.details?.fields ?? null),
  });
  return (
    <AuthForm {...{ form, submit }} aria-label="Join">
      <TextField
        label="Name"
        name="name"
        autoComplete="name"
        value={values.name}
        onChange={(name) => set('name', name)}
        error={errors.name}
      />
      <EmailField value={values.email} onChange={(email) => set('email', email)} error={errors.email} />
      <PasswordField
        label="Password"
        name="password"
        autoComplete="new-password"
        hint="At least 10 characters"
        value={values.password}
        onChange={(password) => set('password', password)}
        error={errors.password}
      />
      <chakra.div marginTop="6px">
        <SubmitRow label="Join" busyLabel="Joining…" busy={busy} error={formError} />
      </chakra.div>
    </AuthForm>
  );
}
