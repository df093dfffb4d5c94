import { z } from 'zod';
import { personName } from './accounts';
import { findingTopic } from './reports';
import { text, textOfLines } from './text';

const timeS = z
  .number()
  .min(0, 'A note is pinned to a moment of the take.')
  .max(86_400, 'A note is pinned to a moment of the take.');

/** What a note speaks of. A hit is kept as its time: another version of the measurements may count hits differently. */
export const notePin = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('take') }),
  z.object({ kind: z.literal('time'), timeS }),
  z.object({ kind: z.literal('hit'), timeS }),
  z.object({ kind: z.literal('finding'), topic: findingTopic }),
]);
export type NotePin = z.infer<typeof notePin>;

const body = textOfLines().min(1, 'Write something first.').max(4000, 'A note has at most 4,000 characters.');
const nextItems = z
  .array(
    text()
      .min(1, 'Write what to do, or leave it out.')
      .max(160, 'One thing to do has at most 160 characters.'),
  )
  .max(5, 'A note has at most five things to do.');

export const maxNotes = 500;

export const createNoteRequest = z.object({
  body,
  pin: notePin.default({ kind: 'take' }),
  /** The note that is answered; an answer is pinned where that one is. */
  parentId: z.uuid().optional(),
  /** What to do before the next take; for those with an account. */
  nextItems: nextItems.default([]),
  /** Asked of whoever has no account. */
  guestName: personName.optional(),
});
export type CreateNoteRequest = z.input<typeof createNoteRequest>;

/** PATCH: absent leaves as it is. Things to do that keep their words keep their ticks. */
export const updateNoteRequest = z.object({ body: body.optional(), nextItems: nextItems.optional() });
export type UpdateNoteRequest = z.infer<typeof updateNoteRequest>;

/** One thing to do before the next take, as somebody asked for it in a note. */
export const nextItem = z.object({
  id: z.uuid(),
  text: z.string(),
  /** When the player ticked it. */
  doneAt: z.iso.datetime().nullable(),
  /** It was ticked since the one who asked for it looked last. */
  isNews: z.boolean(),
});
export type NextItem = z.infer<typeof nextItem>;

export const noteResponse = z.object({
  id: z.uuid(),
  parentId: z.uuid().nullable(),
  /** Null: whoever wrote it has left. `guest`: without an account, under a name of their own choice. */
  from: z.object({ name: z.string().nullable(), as: z.enum(['player', 'reader', 'guest']) }),
  pin: notePin,
  /** Empty where the note was removed and only its answers are left. */
  body: z.string(),
  isRemoved: z.boolean(),
  nextItems: z.array(nextItem),
  createdAt: z.iso.datetime(),
  editedAt: z.iso.datetime().nullable(),
  /** Written by somebody else since the one who asks looked last; never for guests. */
  isNew: z.boolean(),
  /** What the one who asks may do with it. */
  rights: z.object({ edit: z.boolean(), remove: z.boolean(), report: z.boolean() }),
});
export type NoteResponse = z.infer<typeof noteResponse>;

export const noteThread = noteResponse.extend({ answers: z.array(noteResponse) });
export type NoteThread = z.infer<typeof noteThread>;

export const listNotesResponse = z.object({
  /** Oldest first, as are their answers. */
  items: z.array(noteThread),
  mayNote: z.boolean(),
  /** The take is the asker's own. */
  isOwn: z.boolean(),
  /** Whoever asks has no account: a note needs a name. */
  needsName: z.boolean(),
});
export type ListNotesResponse = z.infer<typeof listNotesResponse>;

/** Everything up to this moment was on the page of the one who asks. */
export const readNotesRequest = z.object({ until: z.iso.datetime() });
export type ReadNotesRequest = z.infer<typeof readNotesRequest>;

export const tickNextItemRequest = z.object({ done: z.boolean() });
export type TickNextItemRequest = z.infer<typeof tickNextItemRequest>;

/** Something is wrong with a note, or, without one, with the sheet: told to whoever runs the installation. */
export const createComplaintRequest = z.object({
  noteId: z.uuid().optional(),
  reason: textOfLines()
    .min(1, 'Write what is wrong with it.')
    .max(500, 'At most 500 characters say what is wrong.'),
});
export type CreateComplaintRequest = z.infer<typeof createComplaintRequest>;

export const complaintResponse = z.object({
  id: z.uuid(),
  createdAt: z.iso.datetime(),
  reason: z.string(),
  /** Null: somebody without an account. */
  from: z.string().nullable(),
  take: z.object({ id: z.uuid(), number: z.int().positive(), player: z.string() }),
  /** Null where the sheet itself is meant, or the note is gone for good. */
  note: z
    .object({ id: z.uuid(), name: z.string().nullable(), body: z.string(), isRemoved: z.boolean() })
    .nullable(),
  settledAt: z.iso.datetime().nullable(),
});
export type ComplaintResponse = z.infer<typeof complaintResponse>;

export const listComplaintsResponse = z.object({ items: z.array(complaintResponse) });
export type ListComplaintsResponse = z.infer<typeof listComplaintsResponse>;

/** `removeNote`: the note that is complained of goes, for everybody. */
export const settleComplaintRequest = z.object({ removeNote: z.boolean().default(false) });
export type SettleComplaintRequest = z.input<typeof settleComplaintRequest>;

/** Something about a take's notes changed; whoever shows them reads them again. */
export const notesEvent = z.object({ takeId: z.uuid() });
export type NotesEvent = z.infer<typeof notesEvent>;
