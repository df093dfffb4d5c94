import { EntityManager } from '@mikro-orm/postgresql';
import { Inject, Injectable } from '@nestjs/common';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { NextItem } from '../notes/entities/next-item.entity';
import { Note } from '../notes/entities/note.entity';
import { mayRead } from '../notes/note-reader';
import { wasSentTo } from '../notes/note-readers.service';
import { pinOf } from '../notes/notes.mapper';
import { Share } from '../shares/entities/share.entity';
import { isOpen } from '../shares/open-shares';
import { Take } from '../takes/entities/take.entity';
import { isClosed } from '../users/closed-account';
import { User } from '../users/entities/user.entity';
import { ChosenMail } from './chosen-mail';
import { MailJob } from './mail-jobs';
import { noteMail, tickedMail } from './templates/note-mail';

type NoteJob = Extract<MailJob, { kind: 'note' | 'answer' }>;
type TickedJob = Extract<MailJob, { kind: 'ticked' }>;

/** Mails about notes, as things stand when they are sent: not of a note that is gone, nor to whoever may read it no more. */
@Injectable()
export class NoteMailWriter {
  constructor(
    private readonly em: EntityManager,
    private readonly chosen: ChosenMail,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  async writeNote({ kind, noteId, userId }: NoteJob): Promise<void> {
    const em = this.em.fork();
    const note = await findStanding(em, noteId);
    const user = await findReachable(em, userId);
    if (!note || !user || !(await isFor(em, user, note))) return;
    const items = await em.find(NextItem, { note }, { orderBy: { rank: 'asc' } });
    const take = note.take.unwrap();
    const mail = noteMail({
      kind,
      name: user.name,
      from: note.author?.unwrap().name ?? note.guestName ?? 'Somebody',
      take,
      pin: pinOf(note),
      body: note.body,
      nextItems: items.map(({ text }) => text),
      url: this.urlOf(note),
    });
    await this.chosen.toUser(user, 'notes', mail);
  }

  /** Nothing where more was ticked later, whose own mail tells of all; nor where the ticks are gone by now. */
  async writeTicked({ noteId, doneAt }: TickedJob): Promise<void> {
    const em = this.em.fork();
    const note = await findStanding(em, noteId);
    const user = note?.author && (await findReachable(em, note.author.id));
    if (!note || !user || !(await isFor(em, user, note))) return;
    const items = await em.find(NextItem, { note, doneAt: { $ne: null } }, { orderBy: { rank: 'asc' } });
    const latest = Math.max(...items.map((item) => item.doneAt?.getTime() ?? 0));
    if (latest !== Date.parse(doneAt)) return;
    const take = note.take.unwrap();
    const mail = tickedMail({
      name: user.name,
      player: take.owner.unwrap().name,
      take,
      done: items.map(({ text }) => text),
      url: this.urlOf(note),
    });
    await this.chosen.toUser(user, 'notes', mail);
  }

  private urlOf({ id, take }: Note): string {
    return new URL(`/takes/${take.id}#note-${id}`, this.config.publicUrl).href;
  }
}

function findStanding(em: EntityManager, noteId: string): Promise<Note | null> {
  return em.findOne(
    Note,
    { id: noteId, deletedAt: null, take: { deletedAt: null } },
    { populate: ['author', 'parent', 'take.owner'] },
  );
}

/** Strangers' words go only to addresses that somebody has shown to be theirs. */
async function findReachable(em: EntityManager, userId: string): Promise<User | null> {
  const user = await em.findOne(User, { id: userId, emailVerifiedAt: { $ne: null } });
  return user && !isClosed(user) ? user : null;
}

async function isFor(em: EntityManager, user: User, note: Note): Promise<boolean> {
  const take: Take = note.take.unwrap();
  if (user.id === take.owner.id) return true;
  const seesAll = await wasSentTo(em, user.id, take.id);
  const written = await em.find(Note, { author: user, take, share: { $ne: null } });
  const used = written.flatMap(({ share }) => share?.id ?? []);
  const open = await em.find(Share, { $and: [isOpen(), { id: { $in: used } }] });
  const shareIds = open.map(({ id }) => id);
  if (!seesAll && shareIds.length === 0) return false;
  const reader = { userId: user.id, ownerId: take.owner.id, guestId: null, shareIds, seesAll };
  const root = note.parent?.unwrap();
  return mayRead(reader, note) && (!root || mayRead(reader, root));
}
