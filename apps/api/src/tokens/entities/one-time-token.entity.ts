import { defineEntity, InferEntity, p } from '@mikro-orm/core';
import { identity } from '../../database/identity';
import { User } from '../../users/entities/user.entity';

export const oneTimeTokenKinds = ['verify', 'reset', 'phone', 'new-address'] as const;
export type OneTimeTokenKind = (typeof oneTimeTokenKinds)[number];

/** A link that does one thing once. */
export const OneTimeToken = defineEntity({
  name: 'OneTimeToken',
  tableName: 'one_time_token',
  properties: {
    ...identity,
    kind: p.string().$type<OneTimeTokenKind>().length(20),
    /** SHA-256 of the token. */
    hash: p.string().length(64).unique(),
    user: () => p.manyToOne(User).ref().index().deleteRule('cascade'),
    /** The address it was sent to, as it was then. */
    email: p.string().length(254),
    expiresAt: p.datetime().index(),
    usedAt: p.datetime().nullable(),
  },
});
export type OneTimeToken = InferEntity<typeof OneTimeToken>;
