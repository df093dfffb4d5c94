import { chakra, type HTMLChakraProps } from '@chakra-ui/react';
import type { useAuthForm } from '../hooks/useAuthForm';

interface AuthFormProps extends Omit<HTMLChakraProps<'form'>, 'onSubmit'> {
  form: ReturnType<typeof useAuthForm>['form'];
  submit: () => Promise<void>;
  'aria-label': string;
}

/** A form whose errors are ours to tell, one field under the other. */
export function AuthForm({ form, submit, ...look }: AuthFormProps) {
  return (
    <chakra.form
      ref={form}
      noValidate
      display="grid"
      gap="16px"
      {...look}
      onSubmit={(event) => {
        event.preventDefault();
        void submit();
      }}
    />
  );
}
