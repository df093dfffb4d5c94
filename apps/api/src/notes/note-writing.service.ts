import { EntityManager } from '@mikro-orm/postgresql';
import { Inject, Injectable } from '@nestjs/common';
import { createNoteRequest, maxNotes, NotePin, UpdateNoteRequest } from '@thudline/contracts';
import { z } from 'zod';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { AppError, notFound } from '../errors/app-error';
import { Share } from '../shares/entities/share.entity';
import { restorableSince } from '../takes/deleted-takes';
import { TakeFile } from '../takes/entities/take-file.entity';
import { ThrottleService } from '../throttle/throttle.service';
import { Note, Remover } from './entities/note.entity';
import { NextItemsService } from './next-items.service';
import { NoteMails } from './note-mails';
import { isBy, isOwner, NoteReader } from './note-reader';
import { NotesService } from './notes.service';

type NewNote = z.output<typeof createNoteRequest>;

/** Where a note comes from, beside who wrote it. */
export interface NoteOrigin {
  /** By which it may be written; null for the take's player. */
  share: Share | null;
  address: string;
}

@Injectable()
export class NoteWritingService {
  constructor(
    private readonly em: EntityManager,
    private readonly notes: NotesService,
    private readonly items: NextItemsService,
    private readonly mails: NoteMails,
    private readonly throttle: ThrottleService,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  async create(reader: NoteReader, request: NewNote, origin: NoteOrigin): Promise<Note> {
    checkGuest(reader, request);
    await this.countTry(reader, origin);
    const root = await this.rootOf(reader, request.parentId);
    if (!root) await this.checkPin(reader.takeId, request.pin);
    if ((await this.em.count(Note, { take: reader.takeId })) >= maxNotes)
      throw new AppError('conflict', `A sheet holds ${maxNotes} notes.`);
    return this.em.transactional(async (em) => {
      const note = em.create(Note, {
        take: reader.takeId,
        parent: root,
        ...writerColumns(reader, request),
        share: origin.share,
        ...(root ? pinOfRoot(root) : pinColumns(request.pin)),
        body: request.body,
      });
      await this.items.replace(em, note, request.nextItems);
      await em.flush();
      await this.mails.tellOf(em, note, root);
      return note;
    });
  }

  async update(reader: NoteReader, noteId: string, { body, nextItems }: UpdateNoteRequest): Promise<Note> {
    const note = await this.getOwn(reader, noteId);
    if (body !== undefined && body !== note.body) Object.assign(note, { body, editedAt: new Date() });
    if (nextItems !== undefined) {
      checkGuest(reader, { nextItems, guestName: note.guestName ?? undefined });
      await this.items.replace(this.em, note, nextItems);
    }
    await this.em.flush();
    return note;
  }

  /** It can be brought back by whoever took it away. Safe to call twice. */
  async remove(reader: NoteReader, noteId: string): Promise<void> {
    const note = await this.notes.getReadable(reader, noteId);
    const remover: Remover | null = isBy(reader, note) ? 'author' : isOwner(reader) ? 'player' : null;
    if (!remover) throw notTheirs();
    if (note.deletedAt) return;
    Object.assign(note, { deletedAt: new Date(), removedBy: remover });
    await this.em.flush();
  }

  /** Safe to call twice. */
  async restore(reader: NoteReader, noteId: string): Promise<Note> {
    const note = await this.notes.getReadable(reader, noteId);
    if (!note.deletedAt) return note;
    const mayRestore =
      (note.removedBy === 'author' && isBy(reader, note)) || (note.removedBy === 'player' && isOwner(reader));
    if (!mayRestore || note.deletedAt < restorableSince()) throw notFound();
    Object.assign(note, { deletedAt: null, removedBy: null });
    await this.em.flush();
    return note;
  }

  private async getOwn(reader: NoteReader, noteId: string): Promise<Note> {
    const note = await this.notes.getReadable(reader, noteId);
    if (note.deletedAt) throw notFound();
    if (!isBy(reader, note)) throw notTheirs();
    return note;
  }

  /** Threads are one level deep: whoever answers an answer answers the note that began it. */
  private async rootOf(reader: NoteReader, parentId: string | undefined): Promise<Note | null> {
    if (parentId === undefined) return null;
    const answered = await this.notes.getReadable(reader, parentId);
    const root = answered.parent?.unwrap() ?? answered;
    if (root.deletedAt) throw notFound();
    return root;
  }

  private async checkPin(takeId: string, pin: NotePin): Promise<void> {
    if (pin.kind !== 'time' && pin.kind !== 'hit') return;
    const files = await this.em.find(TakeFile, { take: takeId });
    const durationS = Math.max(...files.map(({ frames, sampleRateHz }) => frames / sampleRateHz));
    if (pin.timeS > durationS) throw new AppError('bad-request', 'The take is over by then. Pin it earlier.');
  }

  private async countTry({ userId }: NoteReader, { share, address }: NoteOrigin): Promise<void> {
    const { notesPerAccount, guestNotesPerAddress, guestNotesPerLink } = this.config.limits;
    if (userId) return this.throttle.count({ key: `note:${userId}`, limit: notesPerAccount, windowS: 3_600 });
    await this.throttle.count({ key: 'guest-note', address, limit: guestNotesPerAddress, windowS: 900 });
    const link = `guest-note:${share?.id ?? 'none'}`;
    await this.throttle.count({ key: link, limit: guestNotesPerLink, windowS: 3_600 });
  }
}

function writerColumns({ userId, guestId }: NoteReader, { guestName }: NewNote) {
  return userId ? { author: userId } : { guestId, guestName: guestName ?? null };
}

function pinColumns(pin: NotePin) {
  return {
    pinKind: pin.kind,
    pinTimeS: pin.kind === 'time' || pin.kind === 'hit' ? pin.timeS : null,
    findingTopic: pin.kind === 'finding' ? pin.topic : null,
  };
}

const pinOfRoot = ({ pinKind, pinTimeS, findingTopic }: Note) => ({ pinKind, pinTimeS, findingTopic });

/** Nobody without an account puts something on a player's list, or writes without a name. */
function checkGuest(
  { userId }: NoteReader,
  { guestName, nextItems }: Pick<NewNote, 'guestName' | 'nextItems'>,
) {
  if (userId) return;
  if (!guestName) {
    const message = 'Write the name the player should see.';
    throw new AppError('bad-request', message, { details: { fields: { guestName: message } } });
  }
  if (nextItems.length > 0) throw new AppError('forbidden', 'Sign in to put something on the player’s list.');
}

const notTheirs = () => new AppError('forbidden', 'Somebody else wrote this note.');
