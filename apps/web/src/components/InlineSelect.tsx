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
    <chakra.select
      aria-label={label}
      value={value}
      // As wide as the word that is chosen, not as the longest of the list; a letter is about 0.92 of ch on average.
      width={`${words(value).length * 0.92 + 1.1}ch`}
      appearance="none"
      minHeight="32px"
      paddingX="3px"
      bg="transparent"
      color="ink"
      fontWeight={600}
      borderRadius="0"
      borderBottom="2px solid"
      borderColor="edge"
      cursor="pointer"
      css={{ '& option': { background: 'sheet', color: 'ink' } }}
      onChange={(event) => {
        const chosen = options.find((option) => option === event.target.value);
        if (chosen) onChange(chosen);
      }}
    >
      {options.map((option) => (
        <option key={option} value={option}>
          {words(option)}
        </option>
      ))}
    </chakra.select>
  );
}
