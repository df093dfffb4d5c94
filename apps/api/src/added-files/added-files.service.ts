import { EntityManager, LockMode } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { addedFileLimits, MakeAddedFileRequest } from '@thudline/contracts';
import { openWav } from '@thudline/dsp';
import { validate } from 'uuid';
import { AppError, notFound } from '../errors/app-error';
import { ListenWav } from '../sound/listen-wav';
import { turnedDown } from '../sound/turned-down';
import { ObjectSource } from '../storage/object-source';
import { ObjectStoreService } from '../storage/object-store.service';
import { Take } from '../takes/entities/take.entity';
import { AddedFileQueue } from './added-file-queue';
import { MadeFile, madeFileOf } from './added-files.mapper';
import { AddedFile } from './entities/added-file.entity';

const { mostOfTake } = addedFileLimits;

/** What takes and their owners may do with added files; the worker's side is `AddedFileClaims`. */
@Injectable()
export class AddedFilesService {
  constructor(
    private readonly em: EntityManager,
    private readonly queue: AddedFileQueue,
    private readonly objects: ObjectStoreService,
  ) {}

  async list(takeId: string): Promise<{ take: Take; files: AddedFile[] }> {
    const take = await this.em.findOneOrFail(Take, { id: takeId });
    const files = await this.em.find(AddedFile, { take: takeId }, { orderBy: { id: 'desc' } });
    return { take, files };
  }

  /**
   * Has the two added with a choice. The same choice again is the same file; one that failed is tried again.
   *
   * @throws {AppError} `conflict` where a take has as many as it may
   */
  async make(takeId: string, request: MakeAddedFileRequest): Promise<{ take: Take; file: AddedFile }> {
    return this.em.transactional(async (em) => {
      // Two that ask at the same moment queue here: the second finds what the first has written.
      const take = await em.findOneOrFail(Take, { id: takeId }, { lockMode: LockMode.PESSIMISTIC_WRITE });
      const choice = roundedChoice(request);
      const earlier = await em.findOne(AddedFile, { take: takeId, ...choice });
      if (earlier && earlier.state !== 'failed') return { take, file: earlier };
      if (!earlier) await refuseMore(em, takeId);
      const waiting = { state: 'queued' as const, progress: 0, attempt: 0, heartbeatAt: new Date() };
      const file = earlier
        ? em.assign(earlier, { ...waiting, reason: null })
        : em.create(AddedFile, { take, ...choice, ...waiting });
      await em.flush();
      await this.queue.send(em, file.id);
      return { take, file };
    });
  }

  /** Removes the row, then the object; a worker that is at it finds its row gone and keeps nothing. */
  async remove(takeId: string, fileId: string): Promise<void> {
    const file = await this.get(takeId, fileId);
    const { objectKey } = file;
    await this.em.remove(file).flush();
    if (objectKey != null) await this.objects.remove([objectKey]);
  }

  /** @throws {AppError} `not-found` where it isn't there, or isn't made yet */
  async getMade(takeId: string, fileId: string): Promise<{ take: Take; file: AddedFile; made: MadeFile }> {
    const file = await this.get(takeId, fileId);
    const made = madeFileOf(file);
    if (!made) throw notFound();
    return { take: await this.em.findOneOrFail(Take, { id: takeId }), file, made };
  }

  /** The added file as it is heard: no louder than the two as recorded. */
  async listenWav(takeId: string, fileId: string): Promise<{ wav: ListenWav; etag: string }> {
    const { made } = await this.getMade(takeId, fileId);
    const source = new ObjectSource(this.objects, made.objectKey, made.bytes);
    const track = (await openWav(source)).track(0);
    const etag = `"${made.sha256.slice(0, 24)}${Math.round(made.listenGainDb * -100)}"`;
    return { wav: new ListenWav([turnedDown(track, made.listenGainDb)]), etag };
  }

  private async get(takeId: string, fileId: string): Promise<AddedFile> {
    const file = validate(fileId) ? await this.em.findOne(AddedFile, { id: fileId, take: takeId }) : null;
    if (!file) throw notFound();
    return file;
  }
}

/** So that a choice that reads the same on the sheet is the same; never −0. */
function roundedChoice({ flipped, shiftMs, gainDb }: MakeAddedFileRequest) {
  return {
    flipped,
    shiftMs: Math.round(shiftMs * 1000) / 1000 + 0,
    gainDb: Math.round(gainDb * 100) / 100 + 0,
  };
}

async function refuseMore(em: EntityManager, takeId: string): Promise<void> {
  if ((await em.count(AddedFile, { take: takeId })) < mostOfTake) return;
  throw new AppError('conflict', `A take keeps up to ${mostOfTake} added files; remove one to make another.`);
}
