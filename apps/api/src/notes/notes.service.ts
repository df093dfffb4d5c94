import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { ListNotesResponse, NoteThread } from '@thudline/contracts';
import { validate } from 'uuid';
import { notFound } from '../errors/app-error';
import { NextItem } from './entities/next-item.entity';
import { Note } from './entities/note.entity';
import { isOwner, mayRead, NoteReader } from './note-reader';
import { noteResponseOf, threadsOf } from './notes.mapper';

/** Reading notes: what somebody may see of the conversation on a take, and up to when they have. */
@Injectable()
export class NotesService {
  constructor(private readonly em: EntityManager) {}

  async list(reader: NoteReader): Promise<ListNotesResponse> {
    const notes = await this.em.find(
      Note,
      { take: reader.takeId },
      { orderBy: { id: 'asc' }, populate: ['author'] },
    );
    const items = await this.itemsOf(notes);
    const told = notes
      .filter((note) => mayRead(reader, note))
      .map((note) => noteResponseOf(reader, note, items.get(note.id) ?? []));
    return {
      items: threadsOf(told),
      mayNote: reader.mayNote,
      isOwn: isOwner(reader),
      needsName: reader.userId === null,
    };
  }

  /** @returns the whole thread that the note is in */
  async thread(reader: NoteReader, { id, parent }: Note): Promise<NoteThread> {
    const { items } = await this.list(reader);
    const found = items.find((thread) => thread.id === (parent?.id ?? id));
    if (!found) throw notFound();
    return found;
  }

  /** @throws {AppError} `not-found` for a note of another take, and one that isn't theirs to see */
  async getReadable(reader: NoteReader, noteId: string): Promise<Note> {
    const note = validate(noteId)
      ? await this.em.findOne(Note, { id: noteId, take: reader.takeId }, { populate: ['author', 'parent'] })
      : null;
    const isThere = note && mayRead(reader, note) && (!note.parent || mayRead(reader, note.parent.unwrap()));
    if (!isThere) throw notFound();
    return note;
  }

  /** Never goes back: of two tabs the one that has read on counts. */
  async markRead(userId: string, takeId: string, until: string): Promise<void> {
    const readAt = new Date(Math.min(Date.parse(until), Date.now()));
    await this.em.getConnection().execute(
      `insert into read_mark (user_id, take_id, read_at) values (?, ?, ?)
       on conflict (user_id, take_id) do update set read_at = greatest(read_mark.read_at, excluded.read_at)`,
      [userId, takeId, readAt],
    );
  }

  private async itemsOf(notes: Note[]): Promise<Map<string, NextItem[]>> {
    const found = await this.em.find(
      NextItem,
      { note: { $in: notes.map(({ id }) => id) } },
      { orderBy: { rank: 'asc', id: 'asc' } },
    );
    const byNote = new Map<string, NextItem[]>();
    for (const item of found) byNote.set(item.note.id, [...(byNote.get(item.note.id) ?? []), item]);
    return byNote;
  }
}
