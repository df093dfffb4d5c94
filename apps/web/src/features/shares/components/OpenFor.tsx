import { Box, Flex, chakra } from '@chakra-ui/react';
import { FieldLabel } from '../../../components/TextField';
import { openForChoices, type OpenForChoice } from '../shareDraft';

const words: Record<OpenForChoice, string> = {
  '1': '1 day',
  '7': '7 days',
  '30': '30 days',
  day: 'until a day',
  never: 'until I end it',
};

interface OpenForProps {
  choice: OpenForChoice;
  day: string;
  onChange: (changed: { openFor: OpenForChoice } | { day: string }) => void;
}

/** How long a link opens what it names. */
export function OpenFor({ choice, day, onChange }: OpenForProps) {
  return (
    <chakra.fieldset marginTop="16px">
      <chakra.legend fontSize="caption" fontWeight={600} color="ink.muted" lineHeight="18px">
        Open for
      </chakra.legend>
      <Flex columnGap="20px" rowGap="2px" wrap="wrap" marginTop="2px">
        {openForChoices.map((each) => (
          <chakra.label
            key={each}
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
              checked={choice === each}
              onChange={() => onChange({ openFor: each })}
            />
            {words[each]}
          </chakra.label>
        ))}
      </Flex>
      {choice === 'day' && (
        <Box marginTop="6px">
          <FieldLabel htmlFor="open-until">Until the end of</FieldLabel>
          <chakra.input
            id="open-until"
            type="date"
            value={day}
            minHeight="44px"
            bg="transparent"
            color="ink"
            borderBottom="2px solid"
            borderColor="edge"
            onChange={(event) => onChange({ day: event.target.value })}
          />
        </Box>
      )}
    </chakra.fieldset>
  );
}
