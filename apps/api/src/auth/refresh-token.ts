import { createHmac, randomBytes, timingSafeEqual } from 'node:crypto';
import { validate } from 'uuid';

/**
 * A refresh token is `<session>.<generation>.<mac>`, the mac made from the session's random seed with the server's
 * secret. Nothing in the database is enough to make one, any earlier token of a session can be told from a forged one,
 * and the current one can be handed out again to a client whose answer got lost.
 */
export interface RefreshToken {
  sessionId: string;
  generation: number;
  mac: string;
}

export const refreshSeed = (): string => randomBytes(32).toString('hex');

function macOf(secret: string, seed: string, sessionId: string, generation: number): string {
  return createHmac('sha256', secret)
    .update(`refresh.${seed}.${sessionId}.${generation}`)
    .digest('base64url');
}

export function refreshTokenText(
  secret: string,
  seed: string,
  sessionId: string,
  generation: number,
): string {
  return `${sessionId}.${generation}.${macOf(secret, seed, sessionId, generation)}`;
}

export function parseRefreshToken(text: string): RefreshToken | null {
  const [sessionId = '', generation = '', mac = ''] = text.split('.');
  if (!validate(sessionId) || !/^\d{1,9}$/.test(generation) || mac.length !== 43) return null;
  return { sessionId, generation: Number(generation), mac };
}

export function isGenuine(token: RefreshToken, secret: string, seed: string): boolean {
  const right = Buffer.from(macOf(secret, seed, token.sessionId, token.generation));
  const given = Buffer.from(token.mac);
  return right.length === given.length && timingSafeEqual(right, given);
}
