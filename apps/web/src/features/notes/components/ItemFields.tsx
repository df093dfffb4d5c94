import { Box, Flex } from '@chakra-ui/react';
import { TextButton } from '../../../components/Button';
import { TextField } from '../../../components/TextField';

const mostItems = 5;

/** Things to do before the next take, a line each. */
export function ItemFields({
  listOf,
  items,
  onChange,
}: {
  /** "your", or "Juno’s". */
  listOf: string;
  items: string[];
  onChange: (items: string[]) => void;
}) {
  const changed = (at: number, text: string) => items.map((item, i) => (i === at ? text : item));
  return (
    <Box marginTop="8px" fontSize="small">
      {items.map((item, i) => (
        <Box key={i} marginTop="6px">
          <TextField
            label={items.length > 1 ? `To do next, ${i + 1}` : 'To do next'}
            value={item}
            maxLength={160}
            autoFocus={item === ''}
            onChange={(text) => onChange(changed(i, text))}
            end={
              <TextButton
                type="button"
                fontSize="caption"
                padding="8px 3px"
                whiteSpace="nowrap"
                aria-label={`Leave out to do next, ${i + 1}`}
                onClick={() => onChange(items.filter((_, other) => other !== i))}
              >
                leave out
              </TextButton>
            }
          />
        </Box>
      ))}
      {items.length < mostItems && (
        <Flex marginTop="6px">
          <TextButton type="button" color="ink.muted" paddingY="4px" onClick={() => onChange([...items, ''])}>
            {items.length === 0 ? `Put something on ${listOf} list` : 'and another'}
          </TextButton>
        </Flex>
      )}
    </Box>
  );
}
