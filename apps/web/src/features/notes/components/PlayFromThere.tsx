import type { NotePin } from '@thudline/contracts';
import { TextButton } from '../../../components/Button';
import { playFrom } from '../playFrom';
import { useNotesBench } from '../notesBench';

/** Where a note is pinned to a moment that may be heard. */
export function PlayFromThere({ pin, isAnswer }: { pin: NotePin; isAnswer: boolean }) {
  const { take, listening } = useNotesBench();
  if (!('timeS' in pin) || isAnswer || !take.rights.listen) return null;
  return <TextButton onClick={() => playFrom(listening, pin.timeS)}>Play from there</TextButton>;
}
