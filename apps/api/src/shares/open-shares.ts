import { FilterQuery } from '@mikro-orm/postgresql';
import { Share } from './entities/share.entity';

/** What a share has to be to open anything: neither ended nor over, and its takes or its try-out still there. */
export function isOpen(now = new Date()): FilterQuery<Share> {
  return {
    revokedAt: null,
    $and: [
      { $or: [{ expiresAt: null }, { expiresAt: { $gt: now } }] },
      { $or: [{ take: null }, { take: { deletedAt: null } }] },
      { $or: [{ otherTake: null }, { otherTake: { deletedAt: null } }] },
      { $or: [{ tryOut: null }, { tryOut: { deletedAt: null } }] },
    ],
  };
}
