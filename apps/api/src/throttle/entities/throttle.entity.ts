import { defineEntity, InferEntity, p } from '@mikro-orm/core';

export const Throttle = defineEntity({
  name: 'Throttle',
  tableName: 'throttle',
  primaryKeys: ['key', 'windowStart'],
  properties: {
    key: p.string().length(120).primary(),
    windowStart: p.datetime().primary().index(),
    count: p.integer(),
  },
});
export type Throttle = InferEntity<typeof Throttle>;
