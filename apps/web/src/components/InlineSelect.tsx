import { chakra } from '@chakra-ui/react';

/** A word inside a sentence that can be exchanged for another: the browser's own list, drawn as an underlined word. */
export function InlineSelect<T extends string>({
  label,
  value,
  options,
  words = (option) => option,
  onChange,
}: {
  label: string;
  value: T;
  options: readonly T[];
  words?: (option: T) => string;
  onChange: (value: T) => void;
}) {
  return (
    <chakra.span
      display="inline-grid"
      position="relative"
      maxWidth="100%"
      marginX="2px"
      height="28px"
      lineHeight="26px"
      verticalAlign="baseline"
      borderBottom="2px solid"
      borderColor="edge"
      fontWeight={600}
    >
      {/* As wide as the word that is chosen, not as the longest of the list. */}
      <chakra.span aria-hidden visibility="hidden" whiteSpace="pre" truncate paddingX="3px">
        {words(value)}
      </chakra.span>
      <chakra.select
        aria-label={label}
        value={value}
        // Reaches beyond the word, so that a finger finds it.
        position="absolute"
        insetX="0"
        insetY="-6px"
        width="100%"
        appearance="none"
        paddingX="3px"
        bg="transparent"
        color="ink"
        textOverflow="ellipsis"
        borderRadius="0"
        cursor="pointer"
        css={{ '& option': { background: 'sheet', color: 'ink' } }}
        onChange={(event) => {
          const chosen = options.find((option) => option === event.target.value);
          if (chosen !== undefined) onChange(chosen);
        }}
      >
        {options.map((option) => (
          <option key={option} value={option}>
            {words(option)}
          </option>
        ))}
      </chakra.select>
    </chakra.span>
  );
}
