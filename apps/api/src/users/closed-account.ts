import { User } from './entities/user.entity';

/** Nobody gets in, and nobody is written to: locked by an admin, or its days of grace are over. */
export function isClosed({ lockedAt, deleteAfter }: User, now = new Date()): boolean {
  return lockedAt != null || (deleteAfter != null && deleteAfter <= now);
}
