import { shareLimits } from '@thudline/contracts';
import { AppError } from '../errors/app-error';

const dayMs = 24 * 60 * 60 * 1000;

interface Expiry {
  expiresInDays: number | null;
  expiresAt?: string | undefined;
}

/** @returns null for a link that is ended by hand. @throws {AppError} `bad-request` for a moment that is over or too far */
export function expiryOf({ expiresInDays, expiresAt }: Expiry, now = new Date()): Date | null {
  if (expiresAt === undefined)
    return expiresInDays === null ? null : new Date(now.getTime() + expiresInDays * dayMs);
  const at = new Date(expiresAt);
  const daysAhead = (at.getTime() - now.getTime()) / dayMs;
  if (daysAhead > 0 && daysAhead <= shareLimits.longestDays) return at;
  const message = daysAhead > 0 ? 'Choose a day within a year.' : 'Choose a day that is still to come.';
  throw new AppError('bad-request', message, { details: { fields: { expiresAt: message } } });
}
