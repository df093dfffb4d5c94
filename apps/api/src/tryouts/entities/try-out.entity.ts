import { defineEntity, InferEntity, p } from '@mikro-orm/core';
import { TryOutSubject, TryOutUnit } from '@thudline/contracts';
import { identity } from '../../database/identity';
import { User } from '../../users/entities/user.entity';

/** Several takes that differ in one thing on purpose. */
export const TryOut = defineEntity({
  name: 'TryOut',
  tableName: 'try_out',
  properties: {
    ...identity,
    owner: () => p.manyToOne(User).ref().index().deleteRule('cascade'),
    subject: p.string().$type<TryOutSubject>().length(40),
    /** In the player's words; empty where the subject says it. */
    differs: p.string().length(80),
    unit: p.string().$type<TryOutUnit>().length(10),
    /** Why the winner won, in the player's words. */
    reason: p.text().default(''),
    /** A place of this try-out. */
    winnerPlaceId: p.uuid().nullable(),
    /** The place that is how things stand now. */
    currentPlaceId: p.uuid().nullable(),
  },
});
export type TryOut = InferEntity<typeof TryOut>;
