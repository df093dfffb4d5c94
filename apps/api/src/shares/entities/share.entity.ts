import { defineEntity, InferEntity, p } from '@mikro-orm/core';
import { identity } from '../../database/identity';
import { Take } from '../../takes/entities/take.entity';
import { User } from '../../users/entities/user.entity';

/** A link that opens one sheet to whoever holds it. */
export const Share = defineEntity({
  name: 'Share',
  tableName: 'share',
  properties: {
    ...identity,
    owner: () => p.manyToOne(User).ref().index().deleteRule('cascade'),
    take: () => p.manyToOne(Take).ref().index().deleteRule('cascade'),
    /** SHA-256 of the token; the token itself is told once and kept nowhere. */
    tokenHash: p.string().length(64).unique(),
    question: p.string().length(300),
    canListen: p.boolean(),
    canDownload: p.boolean(),
    /** Null: until it is ended by hand. */
    expiresAt: p.datetime().nullable(),
    revokedAt: p.datetime().nullable(),
    /** When it was opened last, and how often. */
    openedAt: p.datetime().nullable(),
    openCount: p.integer().default(0),
  },
});
export type Share = InferEntity<typeof Share>;
