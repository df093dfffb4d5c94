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
import { ChangeSide, RoomChangeTake } from './entities/room-change-take.entity';
import { RoomChange } from './entities/room-change.entity';
import { Room } from './entities/room.entity';
import { ownRoom } from './own-room';
import { RoomChangeSides } from './room-change-sides';
import { RoomComparisons } from './room-comparisons';
import { choosableTakeOf, roomChangeResponseOf } from './room-log.mapper';

/** As the log is read: by day, then as they were put on it. */
const inOrder = { happenedOn: 'asc', rank: 'asc', id: 'asc' } as const;

/** A room's dated changes, with the takes that show what each did. */
@Injectable()
export class RoomLogService {
  constructor(
    private readonly em: EntityManager,
    private readonly sides: RoomChangeSides,
    private readonly comparisons: RoomComparisons,
  ) {}

  /** For whoever may read the room; the guard has asked. Only its player is told of takes to choose from. */
  async list(roomId: string, { own }: TakeRights): Promise<ListRoomChangesResponse> {
    const room = await this.em.findOneOrFail(Room, { id: roomId });
    const takes = own ? await this.sides.choosable(room) : [];
    return { items: (await this.whole(room)).reverse(), takes: takes.map(choosableTakeOf) };
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
    where: { roomId: string; changeId: string },
    { beforeTakeIds, afterTakeIds, ...fields }: UpdateRoomChangeRequest,
  ): Promise<RoomChangeResponse> {
    const { room, change } = await this.own(viewer, where);
    const given = Object.entries(fields).filter(([, value]) => value !== undefined);
    this.em.assign(change, Object.fromEntries(given));
    await this.attach(change, { before: beforeTakeIds, after: afterTakeIds });
    await this.em.flush();
    return this.one(room, change.id);
  }

  async remove(viewer: Viewer, where: { roomId: string; changeId: string }): Promise<void> {
    const { change } = await this.own(viewer, where);
    await this.em.removeAndFlush(change);
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
    const found = (await this.whole(room, changeId)).find(({ id }) => id === changeId);
    if (!found) throw notFound();
    return found;
  }

  /** @returns the room's changes, oldest first; only one of them compared where one is named */
  private async whole(room: Room, onlyId?: string): Promise<RoomChangeResponse[]> {
    const changes = await this.em.find(RoomChange, { room }, { orderBy: inOrder });
    const numbered = changes.map((change, index) => ({ change, number: index + 1 }));
    const asked = numbered.filter(({ change }) => !onlyId || change.id === onlyId);
    const sides = await this.sides.of(asked.map(({ change }) => change.id));
    const told = await this.comparisons.of(sides);
    return asked.map(({ change, number }) =>
      roomChangeResponseOf({ change, number, sides: sides.get(change.id), told: told.get(change.id) }),
    );
  }

  private async own(viewer: Viewer, { roomId, changeId }: { roomId: string; changeId: string }) {
    const room = await ownRoom(this.em, viewer, roomId);
    const change = validate(changeId) && (await this.em.findOne(RoomChange, { id: changeId, room }));
    if (!change) throw notFound();
    return { room, change };
  }
}
