import type { ListNotesResponse, NotePin, NoteResponse } from '@thudline/contracts';
import { useState } from 'react';
import type { SheetNotesProps } from '../../sheet/notePlaces';
import { useUndo } from '../../takes/hooks/useUndo';
import { hasSection } from '../aboutChoices';
import { focusNoteBox } from '../noteBox';
import { noteSections, startPin } from '../noteOrder';
import type { NotesBench, Writing } from '../notesBench';
import { sectionReadLast } from '../sectionReadLast';
import { useNoteActions } from './useNoteActions';
import { useReadMark } from './useReadMark';

type BenchProps = Omit<SheetNotesProps, 'places'> & Pick<NotesBench, 'list'>;

/** Puts together what the parts of the notes work with, and the way back from removing one. */
export function useNotesBenchOf(props: BenchProps) {
  const { take, list, report, listening, chosenHit } = props;
  const actions = useNoteActions(take.id);
  const seen = useReadMark(take.id, list);
  const [writing, setWriting] = useState<Writing | null>(null);
  const [boxPin, setBoxPin] = useState<NotePin>({ kind: 'take' });
  const undo = useUndo();
  const writeInBox = () => {
    const section = sectionReadLast(noteSections.filter((each) => hasSection(report, each)));
    setBoxPin(section && section !== 'whole-take' ? startPin(section, 0) : { kind: 'take' });
    focusNoteBox();
  };
  const remove = async (note: NoteResponse) => {
    await actions.remove(note);
    const act = async () => void (await actions.restore(note));
    undo.tell({
      words: 'The note is gone.',
      takesFocus: true,
      takeBack: { act, words: 'The note is back.' },
    });
  };
  const momentS = () =>
    listening.media.currentTime || (chosenHit === null ? 0 : report.hits[chosenHit].timeS);
  const isNew = ({ id }: NoteResponse) => seen.has(id);
  const bench: NotesBench = {
    ...props,
    list: list.isOwn && !take.rights.change ? onlyToRead(list) : list,
    actions,
    isNew,
    momentS,
    writing,
    setWriting,
    boxPin,
    writeInBox,
    remove,
  };
  return { bench, undo };
}

/** What players see behind their own link, and on a phone that reads along, writes nothing. */
function onlyToRead(list: ListNotesResponse): ListNotesResponse {
  const quiet = <T extends NoteResponse>(note: T): T => ({
    ...note,
    rights: { edit: false, remove: false, report: false },
  });
  const items = list.items.map((thread) => ({ ...quiet(thread), answers: thread.answers.map(quiet) }));
  return { ...list, items, mayNote: false };
}
