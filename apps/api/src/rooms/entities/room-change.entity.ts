import { defineEntity, InferEntity, p } from '@mikro-orm/core';
import { ChangeCategory, PlanPlace } from '@thudline/contracts';
import { identity } from '../../database/identity';
import { Photo } from '../../photos/entities/photo.entity';
import { Room } from './room.entity';

/** One entry of a room's log. */
export const RoomChange = defineEntity({
  name: 'RoomChange',
  tableName: 'room_change',
  indexes: [{ properties: ['room', 'happenedOn', 'rank', 'id'] }],
  properties: {
    ...identity,
    room: () => p.manyToOne(Room).ref().deleteRule('cascade'),
    happenedOn: p.date(),
    /** Among the changes of one day: lower stands earlier. */
    rank: p.integer().default(0),
    what: p.string().length(120),
    category: p.string().$type<ChangeCategory>().length(20),
    place: p.json<PlanPlace>().nullable(),
    cost: p.string().length(40),
    note: p.text(),
    photo: () => p.manyToOne(Photo).ref().nullable().index().deleteRule('set null'),
  },
});
export type RoomChange = InferEntity<typeof RoomChange>;
