import { Note } from './entities/note.entity';

/** Whose eyes see notes on a take. */
export interface WhoReads {
  /** The take's player. */
  ownerId: string;
  userId: string | null;
  guestId: string | null;
  /** Links they have opened. */
  shareIds: string[];
  /** The player, and whoever the sheet was sent to by name. */
  seesAll: boolean;
}

/** Whoever reads the notes on one take, and how much of the conversation is theirs. */
export interface NoteReader extends WhoReads {
  takeId: string;
  mayNote: boolean;
  /** Up to when they have read; null where that isn't kept, or they never have. */
  readAt: Date | null;
}

export const isOwner = ({ userId, ownerId }: NoteReader) => userId === ownerId;

export function isBy({ userId, guestId }: WhoReads, note: Note): boolean {
  if (note.author) return note.author.id === userId;
  return note.guestId != null && note.guestId === guestId;
}

/** Behind a link: what the player wrote, and what was written through the same link; never another one's conversation. */
export function mayRead(reader: WhoReads, note: Note): boolean {
  if (reader.seesAll || isBy(reader, note) || note.author?.id === reader.ownerId) return true;
  return note.share != null && reader.shareIds.includes(note.share.id);
}
