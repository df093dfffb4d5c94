import type { ListNotesResponse, NoteResponse, NoteThread } from '@thudline/contracts';

/** Ids that are valid and differ. */
export const noteId = (number: number) =>
  `01890000-0000-7000-8000-0000000009${String(number).padStart(2, '0')}`;

export const sampleNote = (overrides: Partial<NoteResponse> = {}): NoteResponse => ({
  id: noteId(1),
  parentId: null,
  from: { name: 'Oda', as: 'reader' },
  pin: { kind: 'finding', topic: 'adding-up' },
  body: 'Flip it and play eight bars again.',
  isRemoved: false,
  nextItems: [],
  createdAt: '2026-12-02T20:15:00.000Z',
  editedAt: null,
  isNew: false,
  rights: { edit: false, remove: true, report: true },
  ...overrides,
});

export const sampleThread = ({ answers = [], ...note }: Partial<NoteThread> = {}): NoteThread => ({
  ...sampleNote(note),
  answers,
});

export const sampleNotes = (
  items: NoteThread[] = [],
  overrides: Partial<ListNotesResponse> = {},
): ListNotesResponse => ({ items, mayNote: true, isOwn: true, needsName: false, ...overrides });
