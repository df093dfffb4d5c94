import { forgotRequest } from '@thudline/contracts';
import { TextLink } from '../../../components/TextLink';
import { useAccountLinks } from '../hooks/useAccountLinks';
import { useAuthForm } from '../hooks/useAuthForm';
import { AuthForm } from './AuthForm';
import { EmailField } from './EmailField';
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
    <AuthForm {...{ form, submit }} aria-label="Set a new password" gap="22px">
      <EmailField value={values.email} onChange={(email) => set('email', email)} error={errors.email} />
      <SubmitRow label="Send the link" busyLabel="Sending…" busy={busy} error={formError}>
        <TextLink to="/sign-in">Back to sign in</TextLink>
      </SubmitRow>
    </AuthForm>
  );
}
