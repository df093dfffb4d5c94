import type { NoteResponse } from '@thudline/contracts';
import { useNotesBench } from '../notesBench';
import { NoteForm } from './NoteForm';
import { useListOf } from '../hooks/useListOf';

/** A note that its writer writes anew. */
export function NoteEdit({ note }: { note: NoteResponse }) {
  const { actions, setWriting } = useNotesBench();
  const listOf = useListOf();
  const leave = () => setWriting(null);
  return (
    <NoteForm
      label="Write it anew"
      send="Keep it"
      start={{ body: note.body, nextItems: note.nextItems.map(({ text }) => text) }}
      listOf={listOf}
      autoFocus
      onLeave={leave}
      onSend={async ({ body, nextItems }) => {
        await actions.edit(note, listOf ? { body, nextItems } : { body });
        leave();
      }}
    />
  );
}
