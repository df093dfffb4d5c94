import { defineEntity, InferEntity, p } from '@mikro-orm/core';
import { identity } from '../../database/identity';
import { User } from '../../users/entities/user.entity';

/** A picture that somebody added to something of theirs. */
export const Photo = defineEntity({
  name: 'Photo',
  tableName: 'photo',
  properties: {
    ...identity,
    owner: () => p.manyToOne(User).ref().index().deleteRule('cascade'),
    objectKey: p.string().length(255).unique(),
    bytes: p.integer(),
    widthPx: p.integer(),
    heightPx: p.integer(),
  },
});
export type Photo = InferEntity<typeof Photo>;
