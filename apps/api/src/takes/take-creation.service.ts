import { createHash } from 'node:crypto';
import { EntityManager, LockMode } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { CreateTakeRequest, trackRoles } from '@thudline/contracts';
import { v7 } from 'uuid';
import { Viewer } from '../access/viewer';
import { AppError } from '../errors/app-error';
import { MeasurementsService } from '../measuring/measurements.service';
import { findRoom } from '../rooms/find-room';
import { objectKeys } from '../storage/object-keys';
import { ObjectStoreService } from '../storage/object-store.service';
import { User } from '../users/entities/user.entity';
import { TakeFile } from './entities/take-file.entity';
import { TakeTrack } from './entities/take-track.entity';
import { Take } from './entities/take.entity';
import { findUsedSetup } from './used-setup';
import { CheckedFile, checkedFiles } from './upload/checked-files';
import { TakeUpload } from './upload/take-uploads.service';
import { UploadQuota } from './upload/upload-quota';

interface StoredFile extends CheckedFile {
  id: string;
  key: string;
}

interface TakeRows {
  takeId: string;
  request: CreateTakeRequest;
  files: StoredFile[];
}

export interface CreatedTake {
  take: Take;
  isNew: boolean;
}

/** From files in scratch to a take that waits to be measured: all of it or nothing. */
@Injectable()
export class TakeCreationService {
  constructor(
    private readonly em: EntityManager,
    private readonly objects: ObjectStoreService,
    private readonly measurements: MeasurementsService,
    private readonly quota: UploadQuota,
  ) {}

  async create(viewer: Viewer, { request, files }: TakeUpload): Promise<CreatedTake> {
    const earlier = await findUploaded(this.em, viewer, request.uploadKey);
    if (earlier) return { take: earlier, isNew: false };
    await findFollowed(this.em, viewer, request);
    await findUsedSetup(this.em, viewer.user.id, request.setupId);
    await this.quota.check(
      viewer.user,
      files.reduce((sum, { bytes }) => sum + bytes, 0),
    );
    const checked = await checkedFiles(files, request.tracks);
    const takeId = v7();
    const stored = checked.map((file) => stamped(file, takeId));
    await this.putAll(stored);
    return this.writeOrRemove(viewer, { takeId, request, files: stored });
  }

  /** All files, or none stays: what is still on its way is waited for, or it would arrive after the others were removed. */
  private async putAll(files: StoredFile[]): Promise<void> {
    const puts = await Promise.allSettled(files.map((file) => this.objects.putVerified(file)));
    const failed = puts.find((put) => put.status === 'rejected');
    if (!failed) return;
    await this.remove(files);
    throw failed.reason;
  }

  private async writeOrRemove(viewer: Viewer, rows: TakeRows): Promise<CreatedTake> {
    try {
      const created = await this.write(viewer, rows);
      if (!created.isNew) await this.remove(rows.files);
      return created;
    } catch (error) {
      // Where this can't be told either, it throws, and the recordings stay.
      const take = await this.findWritten(viewer, rows.takeId);
      if (take) return { take, isNew: true };
      await this.remove(rows.files);
      throw error;
    }
  }

  /** A connection lost while it commits doesn't tell what became of the rows; behind its lock another one sees. */
  private async findWritten(viewer: Viewer, takeId: string): Promise<Take | null> {
    return this.em.transactional(async (em) => {
      await em.findOneOrFail(User, viewer.user.id, { lockMode: LockMode.PESSIMISTIC_WRITE, refresh: true });
      return em.findOne(Take, { id: takeId });
    });
  }

  private remove(files: StoredFile[]): Promise<void> {
    return this.objects.remove(files.map((file) => file.key));
  }

  private async write(viewer: Viewer, { takeId, request, files }: TakeRows): Promise<CreatedTake> {
    return this.em.transactional(async (em) => {
      // Uploads of one player queue here: the second of two with the same key finds what the first has written.
      const owner = await em.findOneOrFail(User, viewer.user.id, {
        lockMode: LockMode.PESSIMISTIC_WRITE,
        refresh: true,
      });
      const earlier = await findUploaded(em, viewer, request.uploadKey);
      if (earlier) return { take: earlier, isNew: false };
      const setup = await findUsedSetup(em, owner.id, request.setupId);
      if (setup) owner.currentSetupId = setup.id;
      const take = em.create(Take, {
        id: takeId,
        owner,
        number: owner.nextTakeNumber++,
        title: request.title,
        note: request.note,
        recordedAt: request.recordedAt ? new Date(request.recordedAt) : new Date(),
        uploadKey: request.uploadKey,
        tags: request.tags,
        followsTake: await findFollowed(em, viewer, request),
        room: await findRoom(em, viewer.user.id, request.roomId),
        doneActions: request.doneActions,
        setup,
      });
      const fileRows = files.map((file, position) =>
        em.create(TakeFile, { take, position, ...fileColumns(file) }),
      );
      for (const track of request.tracks) {
        const file = fileRows[track.fileIndex];
        if (!file)
          throw new Error(`Track ${track.role} names file ${track.fileIndex}, which was checked before.`);
        const { role, channel } = track;
        em.create(TakeTrack, { take, file, channel, role, position: trackRoles.indexOf(role) });
      }
      await em.flush();
      await this.measurements.queue(em, { take, ownerId: owner.id, inputHash: inputHash(request, files) });
      return { take, isNew: true };
    });
  }
}

async function findUploaded(em: EntityManager, viewer: Viewer, uploadKey: string): Promise<Take | null> {
  const take = await em.findOne(Take, { owner: viewer.user.id, uploadKey });
  if (take?.deletedAt)
    throw new AppError('conflict', 'This take was uploaded before and has been deleted since.');
  return take;
}

/** @returns the take that the new one follows, null where none is named */
async function findFollowed(
  em: EntityManager,
  viewer: Viewer,
  { followsTakeId }: CreateTakeRequest,
): Promise<Take | null> {
  if (!followsTakeId) return null;
  const take = await em.findOne(Take, { id: followsTakeId, owner: viewer.user.id, deletedAt: null });
  if (take) return take;
  throw new AppError('bad-request', 'The take that this one follows is not there any more.', {
    details: { fields: { followsTakeId: 'This take is not there any more.' } },
  });
}

function stamped(file: CheckedFile, takeId: string): StoredFile {
  const id = v7();
  return { ...file, id, key: objectKeys.takeFile(takeId, id) };
}

function fileColumns({ id, key, name, sha256, bytes, facts }: StoredFile) {
  const { encodingName: encoding, dataOffset, blockAlign, frames, channels, sampleRateHz } = facts;
  const { cutShort, broadcast } = facts;
  const format = { encoding, dataOffset, blockAlign, frames, channels, sampleRateHz, cutShort };
  return { id, objectKey: key, name, sha256, bytes, ...format, broadcast };
}

/** Names what is measured: the same sounds in the same roles need no second measurement. */
function inputHash({ tracks }: CreateTakeRequest, files: StoredFile[]): string {
  const inputs = tracks.map(
    ({ role, fileIndex, channel }) => `${role}:${files[fileIndex]?.sha256}:${channel}`,
  );
  return createHash('sha256').update(inputs.sort().join('\n')).digest('hex');
}
