import { createHmac, timingSafeEqual } from 'node:crypto';
import { z } from 'zod';

/** What a token may be used for: one that was made for something else is none. */
export type SignedPurpose = 'mail-choice' | 'invitation';

const macOf = (secret: string, purpose: SignedPurpose, body: string) =>
  createHmac('sha256', secret).update(`${purpose}.${body}`).digest('base64url');

/** A token that says itself what it is about, and that only this installation can make. Nothing secret goes into it. */
export function signedToken(secret: string, purpose: SignedPurpose, payload: object): string {
  const body = Buffer.from(JSON.stringify(payload)).toString('base64url');
  return `${body}.${macOf(secret, purpose, body)}`;
}

interface Signed<T> {
  secret: string;
  purpose: SignedPurpose;
  schema: z.ZodType<T>;
}

/** @returns what it says; null where it isn't ours, was made for something else, or is cut off */
export function readSignedToken<T>(token: string, { secret, purpose, schema }: Signed<T>): T | null {
  const [body = '', mac = ''] = token.split('.');
  const given = Buffer.from(mac);
  const right = Buffer.from(macOf(secret, purpose, body));
  if (given.length !== right.length || !timingSafeEqual(given, right)) return null;
  const parsed = schema.safeParse(JSON.parse(Buffer.from(body, 'base64url').toString()));
  return parsed.success ? parsed.data : null;
}
