import { chakra } from '@chakra-ui/react';
import { signInRequest } from '@thudline/contracts';
import { CheckBox } from '../../../components/CheckBox';
import { PasswordField } from '../../../components/PasswordField';
import { TextLink } from '../../../components/TextLink';
import { useAuthActions } from '../hooks/useAuthActions';
import { useAuthForm } from '../hooks/useAuthForm';
import { AuthForm } from './AuthForm';
import { EmailField } from './EmailField';
import { SubmitRow } from './SubmitRow';

/** Never says which half is wrong: that would tell a stranger who has an account. */
const wrongSignIn = 'wrong sign-in';

export function SignInForm() {
  const { signIn } = useAuthActions();
  const { form, values, errors, formError, busy, set, submit } = useAuthForm({
    schema: signInRequest,
    initial: { email: '', password: '', stay: true },
    send: signIn,
    place: (error) => {
      if (error.code === 'wrong-sign-in') return { password: wrongSignIn };
      return error.details?.fields ?? null;
    },
  });
  return (
    <AuthForm {...{ form, submit }} aria-label="Sign in">
      <EmailField value={values.email} onChange={(email) => set('email', email)} error={errors.email} />
      <PasswordField
        label="Password"
        name="password"
        autoComplete="current-password"
        value={values.password}
        onChange={(password) => set('password', password)}
        error={errors.password === wrongSignIn ? <WrongSignIn /> : errors.password}
      />
      <chakra.div marginTop="2px" marginBottom="-1px">
        <CheckBox checked={values.stay} onChange={(stay) => set('stay', stay)}>
          Stay signed in on this device
        </CheckBox>
      </chakra.div>
      <SubmitRow label="Sign in" busyLabel="Signing in…" busy={busy} error={formError}>
        <TextLink to="/forgot">Forgot the password?</TextLink>
      </SubmitRow>
    </AuthForm>
  );
}

const WrongSignIn = () => (
  <>
    E-mail and password don’t go together. Try again, or <TextLink to="/forgot">set a new password</TextLink>.
  </>
);
