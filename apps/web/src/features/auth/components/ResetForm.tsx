import { resetRequest } from '@thudline/contracts';
import { PasswordField } from '../../../components/PasswordField';
import { useAccountLinks } from '../hooks/useAccountLinks';
import { useAuthForm } from '../hooks/useAuthForm';
import { AuthForm } from './AuthForm';
import { SubmitRow } from './SubmitRow';

/** Asks for a new password; the link has said who asks. */
export function ResetForm({
  token,
  onSet,
  onEnded,
}: {
  token: string;
  onSet: () => void;
  /** The link was used before, or it is too old. */
  onEnded: () => void;
}) {
  const { reset } = useAccountLinks();
  const { form, values, errors, formError, busy, set, submit } = useAuthForm({
    schema: resetRequest,
    initial: { token, password: '' },
    send: async (body) => {
      await reset(body);
      onSet();
    },
    place: (error) => {
      if (error.code === 'link-ended') onEnded();
      return error.details?.fields?.password ? { password: error.details.fields.password } : null;
    },
  });
  return (
    <AuthForm {...{ form, submit }} aria-label="Set a new password" gap="22px">
      <PasswordField
        label="New password"
        name="password"
        autoComplete="new-password"
        hint="At least 10 characters"
        value={values.password}
        onChange={(password) => set('password', password)}
        error={errors.password}
      />
      <SubmitRow
        label="Set it"
        busyLabel="Setting it…"
        busy={busy}
        error={formError || (errors.token ?? '')}
      />
    </AuthForm>
  );
}
