import { Flex, chakra } from '@chakra-ui/react';

const spans: { days: number | null; words: string }[] = [
  { days: 1, words: '1 day' },
  { days: 7, words: '7 days' },
  { days: 30, words: '30 days' },
  { days: null, words: 'until I end it' },
];

/** How long a link opens the sheet. */
export function OpenFor({
  days,
  onChange,
}: {
  days: number | null;
  onChange: (days: number | null) => void;
}) {
  return (
    <chakra.fieldset marginTop="16px">
      <chakra.legend fontSize="caption" fontWeight={600} color="ink.muted" lineHeight="18px">
        Open for
      </chakra.legend>
      <Flex columnGap="20px" rowGap="2px" wrap="wrap" marginTop="2px">
        {spans.map((span) => (
          <chakra.label
            key={span.words}
            display="inline-flex"
            gap="8px"
            minHeight="36px"
            alignItems="center"
            cursor="pointer"
          >
            <chakra.input
              type="radio"
              name="open-for"
              width="18px"
              height="18px"
              accentColor="ink"
              checked={days === span.days}
              onChange={() => onChange(span.days)}
            />
            {span.words}
          </chakra.label>
        ))}
      </Flex>
    </chakra.fieldset>
  );
}
