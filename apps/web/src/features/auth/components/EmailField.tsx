import { TextField, type TextFieldProps } from '../../../components/TextField';

/** The address somebody signs in with. */
export function EmailField(props: Pick<TextFieldProps, 'value' | 'onChange' | 'error'>) {
  return (
    <TextField
      label="E-mail"
      name="email"
      type="email"
      autoComplete="username"
      autoCapitalize="none"
      spellCheck={false}
      {...props}
    />
  );
}
