import { Box } from '@chakra-ui/react';
import type { TakeResponse } from '@thudline/contracts';
import { lazy, Suspense, useRef, useState } from 'react';
import { TextButton } from '../../../components/Button';
import { MarginNote } from './RuledSheet';

/** Only whoever writes loads what writing needs. */
const TakeNoteForm = lazy(async () => ({ default: (await import('./TakeNoteForm')).TakeNoteForm }));

/** What the player wrote about the take, at the head of the margin, and the way to change it. */
export function TakeNote({ take }: { take: TakeResponse }) {
  const [editing, setEditing] = useState(false);
  const edited = useRef(false);
  const leave = () => {
    edited.current = true;
    setEditing(false);
  };
  if (editing)
    return (
      <Suspense fallback={<Box minHeight="230px" />}>
        <TakeNoteForm take={take} onDone={leave} />
      </Suspense>
    );
  return (
    <Box>
      {take.note && (
        <MarginNote from={take.player} about="about this take">
          <Box whiteSpace="pre-wrap" overflowWrap="anywhere">
            {take.note}
          </Box>
        </MarginNote>
      )}
      {take.rights.change && (
        <Box paddingLeft={{ base: 0, lg: '20px' }} marginTop="6px" fontSize="small" color="ink.muted">
          <TextButton
            // After writing, the focus comes back to where it was asked for.
            ref={(button: HTMLButtonElement | null) => {
              if (edited.current) button?.focus();
              edited.current = false;
            }}
            onClick={() => setEditing(true)}
          >
            {take.note ? 'change title or note' : 'add a title or note'}
          </TextButton>
        </Box>
      )}
    </Box>
  );
}
