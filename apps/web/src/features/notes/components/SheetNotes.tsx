import { createPortal } from 'react-dom';
import type { ReactNode } from 'react';
import { UndoBar } from '../../takes/components/UndoBar';
import { SheetRow } from '../../sheet/components/RuledSheet';
import type { NotePlaces, SheetNotesProps } from '../../sheet/notePlaces';
import { hasSection } from '../aboutChoices';
import { useNoteKeys } from '../hooks/useNoteKeys';
import { useNoteOfAddress } from '../hooks/useNoteOfAddress';
import { useNotes } from '../hooks/useNotes';
import { useNotesBenchOf } from '../hooks/useNotesBenchOf';
import { letteredThreads, markPlace, noteSections, type LetteredThread } from '../noteOrder';
import { NotesBenchProvider, type NotesBench } from '../notesBench';
import { MarginNotes } from './MarginNotes';
import { NextItemRows } from './NextItemRows';
import { NoteMark } from './NoteMark';
import { NotesError } from './NotesError';
import { NotesSection } from './NotesSection';
import { TakePins } from './TakePins';
import { AnswerButton, ContentsLink } from './ToNotes';

/** The conversation on a sheet. It stands in places that the sheet keeps for it; none of it is needed to read the sheet. */
export function SheetNotes({ places, ...props }: SheetNotesProps) {
  const { notes, error, retry } = useNotes(props.take.id, { live: props.take.rights.change });
  if (error)
    return (
      <InPlace of={places} name="notes">
        <NotesError error={error} retry={retry} />
      </InPlace>
    );
  return notes ? <ReadNotes {...props} list={notes} places={places} /> : null;
}

type ReadNotesProps = SheetNotesProps & Pick<NotesBench, 'list'>;

function ReadNotes({ places, ...props }: ReadNotesProps) {
  const { bench, undo } = useNotesBenchOf(props);
  const { list, report } = bench;
  const lettered = letteredThreads(list.items, (section) => hasSection(report, section));
  useNoteKeys(bench);
  useNoteOfAddress();
  return (
    <NotesBenchProvider value={bench}>
      <InMargins {...{ places, lettered }} />
      <InPlace of={places} name="pins">
        <TakePins lettered={lettered} />
      </InPlace>
      <InPlace of={places} name="next">
        <NextItemRows />
      </InPlace>
      <InPlace of={places} name="contents">
        <ContentsLink />
      </InPlace>
      <InPlace of={places} name="button">
        <AnswerButton />
      </InPlace>
      <InPlace of={places} name="notes">
        <NotesSection lettered={lettered} />
      </InPlace>
      {undo.words && (
        <SheetRow>
          <UndoBar
            words={undo.words}
            takesFocus={undo.takesFocus}
            failure={undo.failure}
            onUndo={undo.undo}
            onDismiss={undo.dismiss}
          />
        </SheetRow>
      )}
    </NotesBenchProvider>
  );
}

/** Each note in the margin of its section, and its letter behind what it speaks of. */
function InMargins({ places, lettered }: { places: NotePlaces; lettered: LetteredThread[] }) {
  return (
    <>
      {lettered.map((each) => (
        <InPlace key={each.thread.id} of={places} name={markPlace(each.thread.pin) ?? ''}>
          <NoteMark lettered={each} />
        </InPlace>
      ))}
      {noteSections.map((section) => (
        <InPlace key={section} of={places} name={`margin:${section}`}>
          <MarginNotes section={section} threads={lettered.filter((each) => each.section === section)} />
        </InPlace>
      ))}
    </>
  );
}

/** Nothing where the sheet has no such place. */
function InPlace({ of, name, children }: { of: NotePlaces; name: string; children: ReactNode }) {
  const place = of[name];
  return place ? createPortal(children, place) : null;
}
