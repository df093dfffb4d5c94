import { chakra } from '@chakra-ui/react';
import { resetRequest } from '@thudline/contracts';
import { PasswordField } from '../../../components/PasswordField';
import { useAccountLinks } from '../hooks/useAccountLinks';
import { useAuthForm } from '../hooks/useAuthForm';
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
    </chakra.form>
  );
}
