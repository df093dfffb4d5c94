import { FilterQuery } from '@mikro-orm/postgresql';
import { Share } from './entities/share.entity';

/**
 * What a share has to be to open anything: neither ended nor over, its takes or its try-out still there, and its owner's
 * account open.
 */
export function isOpen(now = new Date()): FilterQuery<Share> {
  return {
    revokedAt: null,
    owner: { lockedAt: null, $or: [{ deleteAfter: null }, { deleteAfter: { $gt: now } }] },
    $and: [
      { $or: [{ expiresAt: null }, { expiresAt: { $gt: now } }] },
      { $or: [{ take: null }, { take: { deletedAt: null } }] },
      { $or: [{ otherTake: null }, { otherTake: { deletedAt: null } }] },
      { $or: [{ tryOut: null }, { tryOut: { deletedAt: null } }] },
    ],
  };
}
