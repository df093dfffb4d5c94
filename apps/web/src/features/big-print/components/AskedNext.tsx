import { Box } from '@chakra-ui/react';
import type { TakeResponse } from '@thudline/contracts';
import { useState } from 'react';
import { Button } from '../../../components/Button';
import { FieldError } from '../../../components/FieldError';
import { useNoteActions } from '../../notes/hooks/useNoteActions';
import { useNotes } from '../../notes/hooks/useNotes';
import { askedItems, type AskedItem } from '../../notes/nextItems';
import { writerWords } from '../../notes/noteWords';
import { BigWords } from './BigWords';

/** What notes ask for, below what the sheet asks for. Where they can’t be loaded the sheet’s own actions stand. */
export function AskedNext({ take }: { take: TakeResponse }) {
  const { notes } = useNotes(take.id);
  const asked = notes ? askedItems(notes) : [];
  return asked.map((each) => <AskedWords key={each.item.id} take={take} {...each} />);
}

function AskedWords({ take, item, from }: AskedItem & { take: TakeResponse }) {
  const { tick } = useNoteActions(take.id);
  const [failure, setFailure] = useState('');
  const done = item.doneAt !== null;
  const toggle = async () => {
    setFailure('');
    try {
      await tick(item, !done);
    } catch (error) {
      setFailure(error instanceof Error ? error.message : 'The tick could not be kept. Try again.');
    }
  };
  const detail = from.as === 'player' ? '' : `${writerWords(from)} asks for this.`;
  return (
    <>
      <BigWords status="watch" strong={item.text} detail={detail} done={done} />
      {take.rights.change && (
        <Box as="li" listStyleType="none" marginTop="-14px">
          <Button
            type="button"
            look="outline"
            aria-label={`${item.text}: done`}
            aria-pressed={done}
            onClick={() => void toggle()}
          >
            {done ? 'Take it back' : 'Done'}
          </Button>
          {failure && <FieldError>{failure}</FieldError>}
        </Box>
      )}
    </>
  );
}
