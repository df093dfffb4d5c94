import { defineEntity, InferEntity, p } from '@mikro-orm/core';
import { Take } from '../../takes/entities/take.entity';
import { RoomChange } from './room-change.entity';

export type ChangeSide = 'before' | 'after';

/** A take that shows what a room was like before a change, or after it. */
export const RoomChangeTake = defineEntity({
  name: 'RoomChangeTake',
  tableName: 'room_change_take',
  primaryKeys: ['change', 'take'],
  properties: {
    change: () => p.manyToOne(RoomChange).ref().primary().deleteRule('cascade'),
    take: () => p.manyToOne(Take).ref().primary().index().deleteRule('cascade'),
    side: p.string().$type<ChangeSide>().length(10),
  },
});
export type RoomChangeTake = InferEntity<typeof RoomChangeTake>;
