import { defineEntity, InferEntity, p } from '@mikro-orm/core';
import { Take } from '../../takes/entities/take.entity';
import { User } from '../../users/entities/user.entity';

/** Up to when somebody has read the notes on a take. */
export const ReadMark = defineEntity({
  name: 'ReadMark',
  tableName: 'read_mark',
  primaryKeys: ['user', 'take'],
  properties: {
    user: () => p.manyToOne(User).ref().primary().deleteRule('cascade'),
    take: () => p.manyToOne(Take).ref().primary().index().deleteRule('cascade'),
    readAt: p.datetime(),
  },
});
export type ReadMark = InferEntity<typeof ReadMark>;
