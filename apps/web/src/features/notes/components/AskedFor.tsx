import { Box, Flex } from '@chakra-ui/react';
import type { NextItem } from '@thudline/contracts';
import { StatusMark } from '../../../components/StatusMark';
import { date } from '../../../lib/format';
import { useNotesBench } from '../notesBench';

/** What a note asks to be done before the next take, and what became of it. */
export function AskedFor({ items }: { items: NextItem[] }) {
  const { take } = useNotesBench();
  if (items.length === 0) return null;
  const list = take.rights.change ? 'now on your list' : `on ${take.player}’s list`;
  return (
    <Box as="ul" listStyleType="none" marginTop="3px">
      {items.map(({ id, text, doneAt, isNews }) => (
        <Flex as="li" key={id} gap="7px" alignItems="flex-start">
          {doneAt ? (
            <StatusMark status="good" sizePx={15} />
          ) : (
            <Box width="15px" aria-hidden>
              →
            </Box>
          )}
          <Box>
            {text}{' '}
            <Box as="span" fontSize="caption" color="ink.muted">
              {doneAt ? `done ${date(doneAt)}` : list}
              {isNews && <b> · new</b>}
            </Box>
          </Box>
        </Flex>
      ))}
    </Box>
  );
}
