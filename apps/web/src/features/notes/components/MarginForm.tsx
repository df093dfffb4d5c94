import { Box } from '@chakra-ui/react';
import type { NotePin } from '@thudline/contracts';
import { useNotesBench } from '../notesBench';
import { WriteNote } from './WriteNote';

/** A note that is begun in the margin. */
export function MarginForm({ start }: { start: NotePin }) {
  const { setWriting } = useNotesBench();
  return (
    <Box paddingLeft={{ base: 0, lg: '20px' }}>
      <WriteNote start={start} autoFocus onLeave={() => setWriting(null)} />
    </Box>
  );
}
