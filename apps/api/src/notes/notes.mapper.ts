import { NextItem as NextItemResponse, NotePin, NoteResponse, NoteThread } from '@thudline/contracts';
import { NextItem } from './entities/next-item.entity';
import { Note } from './entities/note.entity';
import { isBy, isOwner, NoteReader } from './note-reader';

/** @param note - with its author */
export function noteResponseOf(reader: NoteReader, note: Note, items: NextItem[]): NoteResponse {
  const isTheirs = isBy(reader, note);
  const isRemoved = note.deletedAt != null;
  const mayChange = !isRemoved && reader.mayNote;
  return {
    id: note.id,
    parentId: note.parent?.id ?? null,
    from: writerOf(reader, note),
    pin: pinOf(note),
    body: isRemoved ? '' : note.body,
    isRemoved,
    nextItems: isRemoved ? [] : items.map((item) => nextItemResponseOf(item, isTheirs ? reader : null)),
    createdAt: note.createdAt.toISOString(),
    editedAt: note.editedAt?.toISOString() ?? null,
    isNew: !isRemoved && !isTheirs && isAfter(note.createdAt, reader),
    rights: {
      edit: mayChange && isTheirs,
      remove: mayChange && (isTheirs || isOwner(reader)),
      report: !isRemoved && !isTheirs,
    },
  };
}

/** @param whoAsked - the reader, where they wrote the note it stands in */
export function nextItemResponseOf(item: NextItem, whoAsked: NoteReader | null): NextItemResponse {
  const { id, text, doneAt } = item;
  const isNews = doneAt != null && whoAsked !== null && isAfter(doneAt, whoAsked);
  return { id, text, doneAt: doneAt?.toISOString() ?? null, isNews };
}

/** Of guests it isn't kept what they have read; whoever may only read isn't spoken to. */
function isAfter(date: Date, { readAt, userId, mayNote }: NoteReader): boolean {
  return userId !== null && mayNote && (readAt === null || date > readAt);
}

function writerOf({ ownerId }: NoteReader, note: Note): NoteResponse['from'] {
  if (note.author) {
    const { id, name } = note.author.unwrap();
    return { name, as: id === ownerId ? 'player' : 'reader' };
  }
  return note.guestId ? { name: note.guestName ?? null, as: 'guest' } : { name: null, as: 'reader' };
}

export function pinOf({ pinKind, pinTimeS, findingTopic }: Note): NotePin {
  if (pinKind === 'finding' && findingTopic) return { kind: pinKind, topic: findingTopic };
  if ((pinKind === 'time' || pinKind === 'hit') && pinTimeS != null)
    return { kind: pinKind, timeS: pinTimeS };
  return { kind: 'take' };
}

/** Answers under what they answer; a note that was removed stands for as long as it has answers. */
export function threadsOf(notes: NoteResponse[]): NoteThread[] {
  const standing = notes.filter(({ parentId, isRemoved }) => parentId === null || !isRemoved);
  return standing
    .filter(({ parentId }) => parentId === null)
    .map((note) => ({ ...note, answers: standing.filter(({ parentId }) => parentId === note.id) }))
    .filter(({ isRemoved, answers }) => !isRemoved || answers.length > 0);
}
