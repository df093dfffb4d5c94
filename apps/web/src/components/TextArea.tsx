import { Box, chakra, type HTMLChakraProps } from '@chakra-ui/react';
import { useId, type ReactNode } from 'react';
import { FieldError } from './FieldError';
import { FieldLabel } from './TextField';

interface TextAreaProps extends Omit<HTMLChakraProps<'textarea'>, 'onChange'> {
  label: string;
  value: string;
  onChange: (value: string) => void;
  error?: ReactNode;
}

/** Room for a few sentences: a box with a rounded pen edge. */
export function TextArea({ label, value, onChange, error, ...textarea }: TextAreaProps) {
  const id = useId();
  return (
    <Box>
      <FieldLabel htmlFor={id}>{label}</FieldLabel>
      <chakra.textarea
        {...textarea}
        id={id}
        value={value}
        onChange={(event) => onChange(event.target.value)}
        aria-invalid={error ? true : undefined}
        aria-describedby={error ? `${id}-error` : undefined}
        display="block"
        width="100%"
        minHeight="74px"
        marginTop="5px"
        padding="9px 12px"
        bg="transparent"
        color="ink"
        fontSize="body"
        lineHeight="24px"
        border="2px solid"
        borderColor={error ? 'fix' : 'edge'}
        borderRadius="3px"
        resize="vertical"
      />
      {error && <FieldError id={`${id}-error`}>{error}</FieldError>}
    </Box>
  );
}
