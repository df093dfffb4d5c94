import { chakra, type HTMLChakraProps } from '@chakra-ui/react';

/** A word inside a sentence that is written, as wide as what stands in it. */
export function InlineText({
  label,
  value,
  onChange,
  ...input
}: Omit<HTMLChakraProps<'input'>, 'onChange' | 'value'> & {
  label: string;
  value: string;
  onChange: (value: string) => void;
}) {
  return (
    <chakra.input
      {...input}
      aria-label={label}
      placeholder="your name"
      required
      autoComplete="name"
      value={value}
      onChange={(event) => onChange(event.target.value)}
      width={`${Math.max(11, value.length + 2)}ch`}
      maxWidth="100%"
      minHeight="30px"
      paddingX="3px"
      bg="transparent"
      color="ink"
      fontWeight={600}
      borderBottom="2px solid"
      borderColor="edge"
      borderRadius="0"
      _placeholder={{ color: 'ink.muted', fontWeight: 400, opacity: 1 }}
    />
  );
}
