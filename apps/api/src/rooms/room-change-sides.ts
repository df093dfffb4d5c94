import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { AppError } from '../errors/app-error';
import { Take } from '../takes/entities/take.entity';
import { ChangeSide, RoomChangeTake } from './entities/room-change-take.entity';
import { Room } from './entities/room.entity';

/** Years of recording; as many rows as still load at once. */
const mostChoosable = 500;

export type Sides = Record<ChangeSide, Take[]>;

export const noSides = (): Sides => ({ before: [], after: [] });

/** Which takes show a room before a change, and which after it. */
@Injectable()
export class RoomChangeSides {
  constructor(private readonly em: EntityManager) {}

  /** @returns by change id; takes that are deleted are left out, the others stand in the order they were recorded in */
  async of(changeIds: string[]): Promise<Map<string, Sides>> {
    const sides = new Map(changeIds.map((id) => [id, noSides()]));
    const rows = await this.em.find(
      RoomChangeTake,
      { change: { $in: changeIds }, take: { deletedAt: null } },
      { populate: ['take', 'take.setup'], orderBy: { take: { recordedAt: 'asc', id: 'asc' } } },
    );
    for (const { change, take, side } of rows) sides.get(change.id)?.[side].push(take.unwrap());
    return sides;
  }

  /** By date: the newest take before that day, and the first one on it or after. */
  async suggested(room: Room, happenedOn: string): Promise<Record<ChangeSide, string[]>> {
    const day = new Date(`${happenedOn}T00:00:00Z`);
    const there = { room, deletedAt: null };
    const [before, after] = await Promise.all([
      this.em.findOne(Take, { ...there, recordedAt: { $lt: day } }, { orderBy: { recordedAt: 'desc' } }),
      this.em.findOne(Take, { ...there, recordedAt: { $gte: day } }, { orderBy: { recordedAt: 'asc' } }),
    ]);
    return { before: before ? [before.id] : [], after: after ? [after.id] : [] };
  }

  /** What can be put on a side. */
  async choosable(room: Room): Promise<Take[]> {
    const orderBy = { recordedAt: 'desc', id: 'desc' } as const;
    return this.em.find(Take, { room, deletedAt: null }, { orderBy, limit: mostChoosable });
  }

  /** @throws {AppError} `bad-request` where one isn't a take of this room */
  async check(room: Room, takeIds: string[]): Promise<void> {
    if (takeIds.length === 0) return;
    const count = await this.em.count(Take, { id: { $in: takeIds }, room, deletedAt: null });
    if (count < takeIds.length)
      throw new AppError('bad-request', 'One of these takes was not recorded in this room.');
  }
}
