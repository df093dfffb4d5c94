import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { NextItem as NextItemResponse } from '@thudline/contracts';
import { validate } from 'uuid';
import { notFound } from '../errors/app-error';
import { MailQueue } from '../mail/mail-queue';
import { NextItem } from './entities/next-item.entity';
import { Note } from './entities/note.entity';
import { nextItemResponseOf } from './notes.mapper';

/** Who ticks one thing ticks the next: one mail tells of all that was ticked by then. */
const tickedMailAfterS = 600;

/** What notes ask to be done before the next take. */
@Injectable()
export class NextItemsService {
  constructor(
    private readonly em: EntityManager,
    private readonly mails: MailQueue,
  ) {}

  /** By the player, who has done it, or after all has not. Whoever asked for it is told. */
  async tick(takeId: string, itemId: string, done: boolean): Promise<NextItemResponse> {
    return this.em.transactional(async (em) => {
      const item = validate(itemId)
        ? await em.findOne(
            NextItem,
            { id: itemId, note: { take: takeId, deletedAt: null } },
            { populate: ['note.take'] },
          )
        : null;
      if (!item) throw notFound();
      if (done !== (item.doneAt != null)) {
        item.doneAt = done ? new Date() : null;
        if (item.doneAt) await this.tellWhoAsked(em, item.note.unwrap(), item.doneAt);
      }
      return nextItemResponseOf(item, null);
    });
  }

  /** Those that keep their words keep their ticks. */
  async replace(em: EntityManager, note: Note, texts: string[]): Promise<void> {
    const there = await em.find(NextItem, { note });
    for (const item of there) if (!texts.includes(item.text)) em.remove(item);
    texts.forEach((text, rank) => {
      const kept = there.find((item) => item.text === text);
      if (kept) kept.rank = rank;
      else em.create(NextItem, { note, text, rank, doneAt: null });
    });
  }

  private async tellWhoAsked(em: EntityManager, note: Note, doneAt: Date): Promise<void> {
    if (!note.author || note.author.id === note.take.unwrap().owner.id) return;
    const job = { kind: 'ticked', noteId: note.id, doneAt: doneAt.toISOString() } as const;
    await this.mails.sendWith(em, job, { startAfter: tickedMailAfterS });
  }
}
