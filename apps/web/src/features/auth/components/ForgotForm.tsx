import { chakra } from '@chakra-ui/react';
import { forgotRequest } from '@thudline/contracts';
import { TextLink } from '../../../components/TextLink';
import { TextField } from '../../../components/TextField';
import { useAccountLinks } from '../hooks/useAccountLinks';
import { useAuthForm } from '../hooks/useAuthForm';
import { SubmitRow } from './SubmitRow';

/** Asks where to send the link; `onSent` hears the address it went to. */
export function ForgotForm({ onSent }: { onSent: (email: string) => void }) {
  const { forgot } = useAccountLinks();
  const { form, values, errors, formError, busy, set, submit } = useAuthForm({
    schema: forgotRequest,
    initial: { email: '' },
    send: async (body) => {
      await forgot(body);
      onSent(body.email);
    },
    place: (error) => error.details?.fields ?? null,
  });
  return (
    <chakra.form
      ref={form}
      noValidate
      aria-label="Set a new password"
      display="grid"
      gap="22px"
      onSubmit={(event) => {
        event.preventDefault();
        void submit();
      }}
    >
      <TextField
        label="E-mail"
        name="email"
        type="email"
        autoComplete="username"
        autoCapitalize="none"
        spellCheck={false}
        value={values.email}
        onChange={(email) => set('email', email)}
        error={errors.email}
      />
      <SubmitRow label="Send the link" busyLabel="Sending…" busy={busy} error={formError}>
        <TextLink to="/sign-in">Back to sign in</TextLink>
      </SubmitRow>
    </chakra.form>
  );
}
