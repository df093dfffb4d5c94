import { Box, chakra } from '@chakra-ui/react';
import { useId } from 'react';
import { FieldLabel } from './TextField';

/** One of several, under a label: the browser's own list over a rule. */
export function SelectField<T extends string>({
  label,
  value,
  options,
  words,
  onChange,
}: {
  label: string;
  value: T;
  options: readonly T[];
  words: (option: T) => string;
  onChange: (value: T) => void;
}) {
  const id = useId();
  return (
    <Box position="relative">
      <FieldLabel htmlFor={id}>{label}</FieldLabel>
      <chakra.select
        id={id}
        value={value}
        onChange={(event) => {
          const chosen = options.find((option) => option === event.target.value);
          if (chosen !== undefined) onChange(chosen);
        }}
        appearance="none"
        width="100%"
        minHeight="44px"
        paddingLeft="3px"
        paddingRight="26px"
        bg="sheet"
        color="ink"
        fontSize="body"
        fontWeight={600}
        textOverflow="ellipsis"
        borderRadius="0"
        borderBottom="2px solid"
        borderColor="edge"
        cursor="pointer"
      >
        {options.map((option) => (
          <option key={option} value={option}>
            {words(option)}
          </option>
        ))}
      </chakra.select>
      <chakra.span
        aria-hidden
        position="absolute"
        right="4px"
        bottom="13px"
        fontSize="12px"
        color="ink.muted"
        pointerEvents="none"
      >
        ▼
      </chakra.span>
    </Box>
  );
}
