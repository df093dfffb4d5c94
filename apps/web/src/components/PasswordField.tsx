import { useState } from 'react';
import { TextButton } from './Button';
import { TextField, type TextFieldProps } from './TextField';

/** A password that can be looked at while it is written. */
export function PasswordField(props: Omit<TextFieldProps, 'type' | 'end'>) {
  const [shown, setShown] = useState(false);
  return (
    <TextField
      {...props}
      type={shown ? 'text' : 'password'}
      autoCapitalize="none"
      spellCheck={false}
      end={
        <TextButton
          type="button"
          fontSize="small"
          color="ink.muted"
          marginX="3px"
          flexShrink={0}
          position="relative"
          _after={{ content: '""', position: 'absolute', inset: '-12px -6px' }}
          aria-label={shown ? 'hide password' : 'show password'}
          onClick={() => setShown(!shown)}
        >
          {shown ? 'hide' : 'show'}
        </TextButton>
      }
    />
  );
}
