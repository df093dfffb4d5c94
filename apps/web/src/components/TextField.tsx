import { Box, Flex, chakra, type HTMLChakraProps } from '@chakra-ui/react';
import { useId, type ReactNode, type Ref } from 'react';
import { FieldError } from './FieldError';

export const FieldLabel = chakra('label', {
  base: { display: 'block', fontSize: 'caption', lineHeight: '18px', fontWeight: 600, color: 'ink.muted' },
});

const FieldInput = chakra('input', {
  base: {
    width: '100%',
    minWidth: 0,
    minHeight: '44px',
    paddingX: '3px',
    bg: 'transparent',
    color: 'ink',
    fontSize: 'body',
    fontWeight: 600,
    borderRadius: '0',
    // The rule under the field shows the focus, across its whole width.
    _focusVisible: { outline: 'none' },
    _placeholder: { color: 'ink.muted', fontWeight: 400, opacity: 1 },
  },
});

export interface TextFieldProps extends Omit<HTMLChakraProps<'input'>, 'onChange'> {
  ref?: Ref<HTMLInputElement>;
  label: string;
  value: string;
  onChange: (value: string) => void;
  /** A rule that can be known beforehand, such as how long a password is. */
  hint?: string;
  error?: ReactNode;
  /** Stands at the right end, above the rule. */
  end?: ReactNode;
}

/** One line to write on: a label, the text, a rule under it. */
export function TextField({ label, value, onChange, hint, error, end, ...input }: TextFieldProps) {
  const id = useId();
  const described = error ? `${id}-error` : hint ? `${id}-hint` : undefined;
  return (
    <Box>
      <FieldLabel htmlFor={id}>{label}</FieldLabel>
      <Flex
        alignItems="center"
        borderBottom="2px solid"
        borderColor={error ? 'fix' : 'edge'}
        css={{
          '&:has(input:focus-visible)': {
            borderColor: 'overhead',
            boxShadow: '0 2px 0 var(--chakra-colors-overhead)',
          },
        }}
      >
        <FieldInput
          {...input}
          id={id}
          value={value}
          onChange={(event) => onChange(event.target.value)}
          aria-invalid={error ? true : undefined}
          aria-describedby={described}
        />
        {end}
      </Flex>
      {hint && !error && (
        <Box id={`${id}-hint`} fontSize="caption" color="ink.muted" marginTop="6px">
          {hint}
        </Box>
      )}
      {error && <FieldError id={`${id}-error`}>{error}</FieldError>}
    </Box>
  );
}
