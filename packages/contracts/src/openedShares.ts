import { z } from 'zod';

/** What a link opens: one sheet, or one page that speaks of several takes and opens none of their sheets. */
export const shareSubject = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('take'), takeId: z.uuid() }),
  /** The take before, then the take after. */
  z.object({ kind: z.literal('comparison'), takeId: z.uuid(), otherTakeId: z.uuid() }),
  z.object({ kind: z.literal('try-out'), tryOutId: z.uuid() }),
  z.object({ kind: z.literal('room'), roomId: z.uuid() }),
]);
export type ShareSubject = z.infer<typeof shareSubject>;
export type ShareKind = ShareSubject['kind'];

/** What a guest may know of the link they opened. */
export const openedShareResponse = z.object({
  subject: shareSubject,
  /** Who sent it. */
  from: z.string(),
  question: z.string(),
  expiresAt: z.iso.datetime().nullable(),
  canListen: z.boolean(),
  canDownload: z.boolean(),
  canNote: z.boolean(),
});
export type OpenedShareResponse = z.infer<typeof openedShareResponse>;
