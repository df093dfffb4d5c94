import { z } from 'zod';
import { readSignedToken, signedToken } from '../tokens/signed-token';

const dayMs = 24 * 60 * 60 * 1000;
/** Common practice, no source. */
export const invitationDays = 14;

const payload = z.object({ email: z.string(), until: z.number() });

/** Lets one address join where joining needs an invitation. */
export function invitationToken(secret: string, email: string, now = Date.now()): string {
  const until = now + invitationDays * dayMs;
  return signedToken(secret, 'invitation', { email: email.toLowerCase(), until });
}

export function isInvited(
  secret: string,
  { invitation, email }: { invitation?: string; email: string },
  now = Date.now(),
): boolean {
  const of = readSignedToken(invitation ?? '', { secret, purpose: 'invitation', schema: payload });
  return of !== null && of.email === email.toLowerCase() && of.until > now;
}
