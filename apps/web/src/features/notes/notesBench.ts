import type { ListNotesResponse, NotePin, NoteResponse } from '@thudline/contracts';
import { createContext, use } from 'react';
import type { SheetNotesProps } from '../sheet/notePlaces';
import type { NoteActions } from './hooks/useNoteActions';
import type { NoteSection } from './noteOrder';

/** What is being written, and where its box stands. */
export type Writing =
  | { what: 'note'; at: NoteSection; pin: NotePin }
  | { what: 'answer'; to: string }
  | { what: 'edit' | 'report'; note: string };

/** What every part of the notes on one sheet works with. */
export interface NotesBench extends Omit<SheetNotesProps, 'places'> {
  list: ListNotesResponse;
  actions: NoteActions;
  /** It was new when it came on the page. */
  isNew: (note: NoteResponse) => boolean;
  /** Where the take stands, or else the chosen hit. */
  momentS: () => number;
  writing: Writing | null;
  setWriting: (writing: Writing | null) => void;
  /** What the box at the end of the sheet is about, and the way into it. */
  boxPin: NotePin;
  writeInBox: () => void;
  remove: (note: NoteResponse) => Promise<void>;
}

const NotesBenchContext = createContext<NotesBench | null>(null);

export const NotesBenchProvider = NotesBenchContext.Provider;

export function useNotesBench(): NotesBench {
  const bench = use(NotesBenchContext);
  if (!bench) throw new Error('Notes stand on a sheet.');
  return bench;
}
