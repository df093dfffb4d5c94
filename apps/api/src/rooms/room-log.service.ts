import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import {
  createRoomChangeRequest,
  ListRoomChangesResponse,
  maxChanges,
  RoomChangeResponse,
  UpdateRoomChangeRequest,
} from '@thudline/contracts';
import { validate } from 'uuid';
import { z } from 'zod';
import { TakeRights } from '../access/take-rights';
import { Viewer } from '../access/viewer';
import { AppError, notFound } from '../errors/app-error';
import { PhotosService } from '../photos/photos.service';
import { settingsOf } from '../users/user-settings';
import { ChangeSide, RoomChangeTake } from './entities/room-change-take.entity';
import { RoomChange } from './entities/room-change.entity';
import { Room } from './entities/room.entity';
import { ownRoom } from './own-room';
import { RoomChangeSides, Sides } from './room-change-sides';
import { RoomComparisons } from './room-comparisons';
import { choosableTakeOf, roomChangeResponseOf } from './room-log.mapper';

interface Where {
  roomId: string;
  changeId: string;
}

/** As the log is read: by day, then as they were put on it. */
const inOrder = { happenedOn: 'asc', rank: 'asc', id: 'asc' } as const;

/** A room's dated changes, with the takes that show what each did. */
@Injectable()
export class RoomLogService {
  constructor(
    private readonly em: EntityManager,
    private readonly sides: RoomChangeSides,
    private readonly comparisons: RoomComparisons,
    private readonly photos: PhotosService,
  ) {}

  /** For whoever may read the room; the guard has asked. Only its player is told of takes to choose from, and sees photos. */
  async list(
    roomId: string,
    { own }: Pick<TakeRights, 'own'>,
    told = maxChanges,
  ): Promise<ListRoomChangesResponse> {
    const room = await this.em.findOneOrFail(Room, { id: roomId });
    const takes = own ? await this.sides.choosable(room) : [];
    const items = (await this.whole(room, { newest: told })).reverse();
    return {
      items: own ? items : items.map((item) => ({ ...item, photo: null })),
      takes: takes.map(choosableTakeOf),
    };
  }

  async get(viewer: Viewer, where: Where): Promise<RoomChangeResponse> {
    const { room, change } = await this.own(viewer, where);
    return this.one(room, change.id);
  }

  async create(
    viewer: Viewer,
    roomId: string,
    { beforeTakeIds, afterTakeIds, ...fields }: z.output<typeof createRoomChangeRequest>,
  ): Promise<RoomChangeResponse> {
    const room = await ownRoom(this.em, viewer, roomId);
    if ((await this.em.count(RoomChange, { room })) >= maxChanges)
      throw new AppError('conflict', `A room’s log holds ${maxChanges} changes. Remove one first.`);
    const change = this.em.create(RoomChange, { room, ...fields, rank: 0 });
    const suggested = await this.sides.suggested(room, fields.happenedOn);
    await this.attach(change, {
      before: beforeTakeIds ?? suggested.before,
      after: afterTakeIds ?? suggested.after,
    });
    await this.em.flush();
    return this.one(room, change.id);
  }

  async update(
    viewer: Viewer,
    where: Where,
    { beforeTakeIds, afterTakeIds, ...fields }: UpdateRoomChangeRequest,
  ): Promise<RoomChangeResponse> {
    const { room, change } = await this.own(viewer, where);
    const given = Object.entries(fields).filter(([, value]) => value !== undefined);
    this.em.assign(change, Object.fromEntries(given));
    await this.attach(change, { before: beforeTakeIds, after: afterTakeIds });
    await this.em.flush();
    return this.one(room, change.id);
  }

  async remove(viewer: Viewer, where: Where): Promise<void> {
    const { change } = await this.own(viewer, where);
    const photo = change.photo?.unwrap();
    await this.em.removeAndFlush(change);
    if (photo) await this.photos.remove(photo);
  }

  async addPhoto(viewer: Viewer, where: Where, received: Buffer): Promise<RoomChangeResponse> {
    const { room, change } = await this.own(viewer, where);
    const old = change.photo?.unwrap() ?? null;
    await this.photos.replace(viewer, { received, old, use: (photo) => this.em.assign(change, { photo }) });
    return this.one(room, change.id);
  }

  async removePhoto(viewer: Viewer, where: Where): Promise<RoomChangeResponse> {
    const { room, change } = await this.own(viewer, where);
    const photo = change.photo?.unwrap();
    change.photo = null;
    if (photo) await this.photos.remove(photo);
    return this.one(room, change.id);
  }

  /** Sides that are named take the place of those there were; a take stands on one side only. */
  private async attach(
    change: RoomChange,
    named: Partial<Record<ChangeSide, string[] | undefined>>,
  ): Promise<void> {
    const ids = [...(named.before ?? []), ...(named.after ?? [])];
    if (new Set(ids).size < ids.length)
      throw new AppError('bad-request', 'A take was recorded before the change or after it, not both.');
    await this.sides.check(change.room.unwrap(), ids);
    const there = await this.em.find(RoomChangeTake, { change });
    const going = there.filter(({ side, take }) => named[side] || ids.includes(take.id));
    for (const one of going) this.em.remove(one);
    await this.em.flush();
    for (const side of ['before', 'after'] as const)
      for (const take of named[side] ?? []) this.em.create(RoomChangeTake, { change, take, side });
  }

  private async one(room: Room, changeId: string): Promise<RoomChangeResponse> {
    const found = (await this.whole(room, { id: changeId })).find(({ id }) => id === changeId);
    if (!found) throw notFound();
    return found;
  }

  /** @returns the room's changes, oldest first; only the one that is named, or with so many of the newest compared */
  private async whole(room: Room, asked: { id: string } | { newest: number }): Promise<RoomChangeResponse[]> {
    const changes = await this.em.find(RoomChange, { room }, { orderBy: inOrder, populate: ['photo'] });
    const numbered = changes.map((change, index) => ({ change, number: index + 1 }));
    const shown = numbered.filter(({ change }) => !('id' in asked) || change.id === asked.id);
    const sides = await this.sides.of(shown.map(({ change }) => change.id));
    const compared = 'id' in asked ? sides : newestOf(shown, sides, asked.newest);
    const { lengthUnit } = settingsOf(await room.owner.loadOrFail());
    const told = await this.comparisons.of({ changes, sides: compared, lengthUnit });
    return shown.map(({ change, number }) =>
      roomChangeResponseOf({
        change,
        number,
        sides: sides.get(change.id),
        told: told.get(change.id),
        isCompared: compared.has(change.id),
      }),
    );
  }

  private async own(viewer: Viewer, { roomId, changeId }: Where) {
    const room = await ownRoom(this.em, viewer, roomId);
    const change =
      validate(changeId) &&
      (await this.em.findOne(RoomChange, { id: changeId, room }, { populate: ['photo'] }));
    if (!change) throw notFound();
    return { room, change };
  }
}

/** The sides of so many of the newest changes. */
const newestOf = (
  shown: readonly { change: RoomChange }[],
  sides: ReadonlyMap<string, Sides>,
  count: number,
): Map<string, Sides> =>
  new Map(
    shown.slice(Math.max(0, shown.length - count)).flatMap(({ change: { id } }) => {
      const own = sides.get(id);
      return own ? [[id, own] as const] : [];
    }),
  );
