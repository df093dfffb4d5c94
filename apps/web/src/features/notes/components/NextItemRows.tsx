import { Box, chakra } from '@chakra-ui/react';
import { useState } from 'react';
import { CheckBox } from '../../../components/CheckBox';
import { FieldError } from '../../../components/FieldError';
import { askedItems, type AskedItem } from '../nextItems';
import { writerWords } from '../noteWords';
import { useNotesBench } from '../notesBench';

/** What notes ask for, below what the sheet itself asks for; the player ticks it. */
export function NextItemRows() {
  const { list } = useNotesBench();
  return askedItems(list).map((asked) => <ItemRow key={asked.item.id} {...asked} />);
}

function ItemRow({ item, from }: AskedItem) {
  const { take, actions } = useNotesBench();
  const [failure, setFailure] = useState('');
  const done = item.doneAt !== null;
  const tick = async (next: boolean) => {
    setFailure('');
    try {
      await actions.tick(item, next);
    } catch (error) {
      setFailure(error instanceof Error ? error.message : 'The tick could not be kept. Try again.');
    }
  };
  const words = (
    <>
      <chakra.span color={done ? 'ink.muted' : 'ink'} fontWeight={done ? 400 : 600}>
        {item.text}
      </chakra.span>{' '}
      {from.as !== 'player' && (
        <chakra.span color="ink.muted">{writerWords(from)} asks for this.</chakra.span>
      )}
    </>
  );
  return (
    <Box
      as="li"
      listStyleType="none"
      borderBottom="1px solid"
      borderColor="rule"
      paddingY={{ base: '8px', _print: '3px' }}
    >
      {take.rights.change ? (
        <CheckBox checked={done} onChange={(next) => void tick(next)}>
          {words}
        </CheckBox>
      ) : (
        words
      )}
      {failure && <FieldError>{failure}</FieldError>}
    </Box>
  );
}
