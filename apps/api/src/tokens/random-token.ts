import { createHash, randomBytes } from 'node:crypto';

/** @returns 256 random bits as text for an address; 43 characters */
export const randomToken = (): string => randomBytes(32).toString('base64url');

/** What the database keeps of a token: enough to know it again, not enough to make it. */
export const tokenHash = (token: string): string => createHash('sha256').update(token).digest('hex');
