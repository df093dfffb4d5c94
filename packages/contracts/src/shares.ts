import { z } from 'zod';
import { shareSubject } from './openedShares';
import { textOfLines, text } from './text';

export const shareLimits = {
  longestDays: 365,
  passphrase: { shortest: 6, longest: 100 },
  /** Links of one player, ended ones too. */
  most: 1000,
} as const;

const { passphrase: passphraseLimits } = shareLimits;

const passphrase = z
  .string()
  .trim()
  .min(passphraseLimits.shortest, `A passphrase has at least ${passphraseLimits.shortest} characters.`)
  .max(passphraseLimits.longest, `A passphrase has at most ${passphraseLimits.longest} characters.`);

export const createShareRequest = z
  .object({
    subject: shareSubject,
    /** Who it is for, in the player's words; only the player sees it. */
    label: text().max(60, 'Who it is for has at most 60 characters.').default(''),
    /** Stands above the line on the shared sheet: "What would you change first?" */
    question: textOfLines().max(300, 'A question has at most 300 characters.').default(''),
    /** Null: until it is ended by hand. */
    expiresInDays: z.int().min(1).max(shareLimits.longestDays).nullable().default(7),
    /** A moment of the player's own in place of a number of days. */
    expiresAt: z.iso.datetime().optional(),
    /** In place of an address told on the page: the link is mailed, and told to nobody else. */
    mailTo: z.email('This is no mail address.').max(254).optional(),
    /** Asked of whoever opens it. */
    passphrase: passphrase.optional(),
    canListen: z.boolean().default(true),
    /** The files of a take, and notes on its sheet: only a link to one take allows them. */
    canDownload: z.boolean().default(false),
    canNote: z.boolean().default(false),
  })
  .refine(({ subject, canDownload, canNote }) => subject.kind === 'take' || (!canDownload && !canNote), {
    message: 'Only a link to one take can let somebody download files or leave notes.',
    path: ['subject'],
  });
export type CreateShareRequest = z.input<typeof createShareRequest>;

export const shareResponse = z.object({
  id: z.uuid(),
  subject: shareSubject,
  /** What it opens, by its own name: "Take 14, loud chorus". */
  about: z.string(),
  label: z.string(),
  question: z.string(),
  canListen: z.boolean(),
  canDownload: z.boolean(),
  canNote: z.boolean(),
  hasPassphrase: z.boolean(),
  /** Null where its address was told on the page. */
  mailedTo: z.string().nullable(),
  createdAt: z.iso.datetime(),
  expiresAt: z.iso.datetime().nullable(),
  revokedAt: z.iso.datetime().nullable(),
  /** When it was opened last, and how often. */
  openedAt: z.iso.datetime().nullable(),
  openCount: z.int().nonnegative(),
});
export type ShareResponse = z.infer<typeof shareResponse>;

/** The address is told once: the token is stored hashed. Null where it is mailed. */
export const createdShareResponse = shareResponse.extend({ url: z.url().nullable() });
export type CreatedShareResponse = z.infer<typeof createdShareResponse>;

/** One subject's links, named by its kind and ids; without a kind, every link of the player's. */
export const listSharesRequest = z.object({
  kind: z.enum(['take', 'comparison', 'try-out', 'room']).optional(),
  takeId: z.uuid().optional(),
  otherTakeId: z.uuid().optional(),
  tryOutId: z.uuid().optional(),
  roomId: z.uuid().optional(),
});
export type ListSharesRequest = z.infer<typeof listSharesRequest>;

/** Newest first. */
export const listSharesResponse = z.object({ items: z.array(shareResponse) });
export type ListSharesResponse = z.infer<typeof listSharesResponse>;

/** Exchanges the token of a link for a cookie; API addresses never carry tokens. */
export const openShareRequest = z.object({
  token: z.string().min(20).max(200),
  passphrase: z.string().max(passphraseLimits.longest).optional(),
});
export type OpenShareRequest = z.infer<typeof openShareRequest>;

/** The sheet anybody may read and hear without an account; null where this installation has none. */
export const sampleSheetResponse = z.object({ takeId: z.uuid().nullable() });
export type SampleSheetResponse = z.infer<typeof sampleSheetResponse>;
