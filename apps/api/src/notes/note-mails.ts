import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { MailQueue } from '../mail/mail-queue';
import { Take } from '../takes/entities/take.entity';
import { Note } from './entities/note.entity';

/** Puts into the queue whom to write of a note; whether they may still read it, and want mail, the worker looks up. */
@Injectable()
export class NoteMails {
  constructor(private readonly mails: MailQueue) {}

  /** Within the transaction of `em`. Guests get no mail: nobody has shown whose address it would be. */
  async tellOf(em: EntityManager, note: Note, root: Note | null): Promise<void> {
    const { owner } = await em.findOneOrFail(Take, { id: note.take.id });
    const kind = root ? 'answer' : 'note';
    const told = new Set(root ? [owner.id, ...(await this.writersOf(em, root))] : [owner.id]);
    if (note.author) told.delete(note.author.id);
    for (const userId of told) await this.mails.sendWith(em, { kind, noteId: note.id, userId });
  }

  private async writersOf(em: EntityManager, root: Note): Promise<string[]> {
    const inThread = { $or: [{ id: root.id }, { parent: root.id }], deletedAt: null };
    const notes = await em.find(Note, inThread);
    return notes.flatMap(({ author }) => author?.id ?? []);
  }
}
