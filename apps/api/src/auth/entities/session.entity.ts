import { defineEntity, InferEntity, p } from '@mikro-orm/core';
import { identity } from '../../database/identity';
import { User } from '../../users/entities/user.entity';

export const Session = defineEntity({
  name: 'Session',
  tableName: 'session',
  properties: {
    ...identity,
    user: () => p.manyToOne(User).ref().index().deleteRule('cascade'),
    /** Random; with the server's secret it makes the refresh tokens of this session. */
    refreshSeed: p.string().length(64),
    /** How often the refresh token was changed. */
    generation: p.integer().default(0),
    rotatedAt: p.datetime(),
    expiresAt: p.datetime(),
    revokedAt: p.datetime().nullable(),
    /** False: the cookies end with the browser session. */
    stay: p.boolean(),
    /** A phone that was let in to read along: nothing can be changed from it. */
    readOnly: p.boolean().default(false),
    /** What the browser says of itself; null for sessions that began before it was kept. */
    userAgent: p.string().length(300).nullable(),
  },
});
export type Session = InferEntity<typeof Session>;
