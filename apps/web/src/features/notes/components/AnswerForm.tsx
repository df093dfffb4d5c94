import { Box } from '@chakra-ui/react';
import type { NoteThread } from '@thudline/contracts';
import { TextField } from '../../../components/TextField';
import { useGuestName } from '../hooks/useGuestName';
import { useListOf } from '../hooks/useListOf';
import { useNotesBench } from '../notesBench';
import { NoteForm } from './NoteForm';

/** The box under a thread. */
export function AnswerForm({ thread }: { thread: NoteThread }) {
  const { actions, list, setWriting } = useNotesBench();
  const guest = useGuestName();
  const leave = () => setWriting(null);
  return (
    <Box marginTop="8px">
      <NoteForm
        label="Your answer"
        send="Send the answer"
        listOf={useListOf()}
        autoFocus
        about={
          list.needsName && (
            <TextField
              label="Your name"
              value={guest.name}
              maxLength={60}
              required
              autoComplete="name"
              onChange={guest.setName}
            />
          )
        }
        onLeave={leave}
        onSend={async (draft) => {
          const guestName = list.needsName ? guest.name : undefined;
          await actions.write({ ...draft, parentId: thread.id, guestName });
          leave();
        }}
      />
    </Box>
  );
}
