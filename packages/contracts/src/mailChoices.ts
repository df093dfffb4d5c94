import { z } from 'zod';
import { mailChoices } from './accounts';

const mailToken = z.string().min(20, 'This link is not whole. Open it again from the mail.').max(600);

/** What the link at the foot of a mail speaks of. Works signed out: whoever has the mail may choose. */
export const readMailChoiceRequest = z.object({ token: mailToken });
export type ReadMailChoiceRequest = z.infer<typeof readMailChoiceRequest>;

export const setMailChoiceRequest = z.object({ token: mailToken, wanted: z.boolean() });
export type SetMailChoiceRequest = z.infer<typeof setMailChoiceRequest>;

export const mailChoiceResponse = z.object({ choice: z.enum(mailChoices), wanted: z.boolean() });
export type MailChoiceResponse = z.infer<typeof mailChoiceResponse>;
