import { defineEntity, InferEntity, p } from '@mikro-orm/core';
import { TryOutSubject, TryOutUnit } from '@thudline/contracts';
import { identity } from '../../database/identity';
import { Setup } from '../../setups/entities/setup.entity';
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
    /** What the winner was made to. */
    winnerSetup: () => p.manyToOne(Setup).ref().nullable().index().deleteRule('set null'),
    /** The player's setup before that, to go back to. */
    setupBeforeId: p.uuid().nullable(),
    /** Kept for a while, so that it can be undone. */
    deletedAt: p.datetime().nullable(),
  },
});
export type TryOut = InferEntity<typeof TryOut>;
