import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { TakeResponse, UpdateTakeRequest } from '@thudline/contracts';
import { readOnly } from '../access/read-only';
import { TakeRights } from '../access/take-rights';
import { Viewer } from '../access/viewer';
import { AuditService } from '../audit/audit.service';
import { notFound } from '../errors/app-error';
import { MeasurementsService } from '../measuring/measurements.service';
import { SheetVersionsService } from '../measuring/sheet-versions.service';
import { findRoom } from '../rooms/find-room';
import { Setup } from '../setups/entities/setup.entity';
import { restorableSince } from './deleted-takes';
import { TakeFile } from './entities/take-file.entity';
import { TakeTrack } from './entities/take-track.entity';
import { Take } from './entities/take.entity';
import { findUsedSetup } from './used-setup';
import { takeResponseOf } from './takes.mapper';

@Injectable()
export class TakesService {
  constructor(
    private readonly em: EntityManager,
    private readonly measurements: MeasurementsService,
    private readonly versions: SheetVersionsService,
    private readonly audit: AuditService,
  ) {}

  async get(takeId: string, rights: TakeRights): Promise<TakeResponse> {
    return this.whole(await this.em.findOneOrFail(Take, { id: takeId }), rights);
  }

  async whole(take: Take, rights: TakeRights): Promise<TakeResponse> {
    const { followsTake, setup } = take;
    const [files, tracks, measurement, versions, follows, followedBy, usedSetup] = await Promise.all([
      this.em.find(TakeFile, { take }, { orderBy: { position: 'asc' } }),
      this.em.find(TakeTrack, { take }, { orderBy: { position: 'asc' } }),
      this.measurements.getLatest(take.id),
      this.versions.of(take),
      followsTake && this.em.findOne(Take, { id: followsTake.id, deletedAt: null }),
      this.em.findOne(Take, { followsTake: take.id, deletedAt: null }, { orderBy: { number: 'desc' } }),
      setup ? this.em.findOne(Setup, { id: setup.id }) : null,
      this.em.populate(take, ['owner', 'room']),
    ]);
    const parts = { take, files, tracks, measurement, versions, rights };
    return takeResponseOf({ ...parts, follows: follows ?? null, followedBy, setup: usedSetup });
  }

  async update(takeId: string, changes: UpdateTakeRequest, rights: TakeRights): Promise<TakeResponse> {
    const { tickedActions, ...others } = changes;
    if (!rights.change && Object.values(others).some((value) => value !== undefined)) throw readOnly();
    const take = await this.em.findOneOrFail(Take, { id: takeId });
    const { title, note, tags, setupId, roomId } = others;
    if (title !== undefined) take.title = title;
    if (note !== undefined) take.note = note;
    if (tickedActions !== undefined) take.tickedActions = tickedActions;
    if (tags !== undefined) take.tags = tags;
    if (setupId !== undefined)
      this.em.assign(take, { setup: await findUsedSetup(this.em, take.owner.id, setupId) });
    if (roomId !== undefined) this.em.assign(take, { room: await findRoom(this.em, take.owner.id, roomId) });
    await this.em.flush();
    return this.whole(take, rights);
  }

  /**
   * A take that was deleted while it waited to be measured is measured after all.
   *
   * @throws {AppError} `not-found` when it was deleted too long ago: its recordings may be going at this moment
   */
  async restore(viewer: Viewer, takeId: string, rights: TakeRights): Promise<TakeResponse> {
    const take = await this.em.findOneOrFail(Take, { id: takeId });
    if (take.deletedAt) {
      if (take.deletedAt < restorableSince()) throw notFound();
      take.deletedAt = null;
      this.audit.record({ kind: 'take-restored', userId: viewer.user.id, subjectId: take.id });
      await this.em.flush();
      const { state } = await this.measurements.getLatest(takeId);
      if (state === 'cancelled') await this.measurements.again(takeId);
    }
    return this.whole(take, rights);
  }

  /** The row and the recordings stay for a while, so that it can be undone; nobody sees them. */
  async remove(viewer: Viewer, takeId: string): Promise<void> {
    const take = await this.em.findOneOrFail(Take, { id: takeId });
    take.deletedAt = new Date();
    this.audit.record({ kind: 'take-deleted', userId: viewer.user.id, subjectId: take.id });
    await this.em.flush();
    await this.measurements.cancel(takeId);
  }
}
