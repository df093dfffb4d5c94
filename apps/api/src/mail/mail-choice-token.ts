import { createHash } from 'node:crypto';
import { MailChoice, mailChoices } from '@thudline/contracts';
import { z } from 'zod';
import { readSignedToken, signedToken } from '../tokens/signed-token';

const payload = z.object({
  choice: z.enum(mailChoices),
  /** Exactly one of the two. */
  userId: z.uuid().optional(),
  emailHash: z.string().length(64).optional(),
});
export type MailChoiceOf = z.infer<typeof payload>;

export const emailHash = (email: string): string =>
  createHash('sha256').update(email.toLowerCase()).digest('hex');

/** For the foot of a mail: who gets it, and about what it is. It doesn't end, as the mail doesn't. */
export function mailChoiceToken(
  secret: string,
  choice: MailChoice,
  to: { email: string; userId: string | null },
): string {
  const whose = to.userId ? { userId: to.userId } : { emailHash: emailHash(to.email) };
  return signedToken(secret, 'mail-choice', { choice, ...whose });
}

export const readMailChoiceToken = (secret: string, token: string): MailChoiceOf | null =>
  readSignedToken(token, { secret, purpose: 'mail-choice', schema: payload });
