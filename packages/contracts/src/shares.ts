import { z } from 'zod';
import { textOfLines } from './text';

export const createShareRequest = z.object({
  /** Stands above the line on the shared sheet: "What would you change first?" */
  question: textOfLines().max(300, 'A question has at most 300 characters.').default(''),
  /** Null: until it is ended by hand. */
  expiresInDays: z.int().min(1).max(365).nullable().default(7),
  canListen: z.boolean().default(true),
  canDownload: z.boolean().default(false),
});
export type CreateShareRequest = z.input<typeof createShareRequest>;

export const shareResponse = z.object({
  id: z.uuid(),
  takeId: z.uuid(),
  question: z.string(),
  canListen: z.boolean(),
  canDownload: z.boolean(),
  createdAt: z.iso.datetime(),
  expiresAt: z.iso.datetime().nullable(),
  revokedAt: z.iso.datetime().nullable(),
  /** When it was opened last, and how often. */
  openedAt: z.iso.datetime().nullable(),
  openCount: z.int().nonnegative(),
});
export type ShareResponse = z.infer<typeof shareResponse>;

/** The address is told once: the token is stored hashed. */
export const createdShareResponse = shareResponse.extend({ url: z.url() });
export type CreatedShareResponse = z.infer<typeof createdShareResponse>;

export const listSharesResponse = z.object({ items: z.array(shareResponse) });
export type ListSharesResponse = z.infer<typeof listSharesResponse>;

/** Exchanges the token of a link for a cookie; API addresses never carry tokens. */
export const openShareRequest = z.object({ token: z.string().min(20).max(200) });
export type OpenShareRequest = z.infer<typeof openShareRequest>;

/** What a guest may know of the link they opened. */
export const openedShareResponse = z.object({
  takeId: z.uuid(),
  /** Who sent it. */
  from: z.string(),
  question: z.string(),
  expiresAt: z.iso.datetime().nullable(),
  canListen: z.boolean(),
  canDownload: z.boolean(),
});
export type OpenedShareResponse = z.infer<typeof openedShareResponse>;

/** The sheet anybody may read and hear without an account; null where this installation has none. */
export const sampleSheetResponse = z.object({ takeId: z.uuid().nullable() });
export type SampleSheetResponse = z.infer<typeof sampleSheetResponse>;
