import { FilterQuery } from '@mikro-orm/postgresql';
import { Share } from './entities/share.entity';

/** What a share has to be to open anything: neither ended nor over, and its take still there. */
export function isOpen(now = new Date()): FilterQuery<Share> {
  return {
    revokedAt: null,
    take: { deletedAt: null },
    $or: [{ expiresAt: null }, { expiresAt: { $gt: now } }],
  };
}
