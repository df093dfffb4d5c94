import { z } from 'zod';

/** How long a finished archive can be downloaded. */
export const exportKeptDays = 7;

export const exportStates = ['queued', 'running', 'done', 'failed'] as const;

/** Everything of an account in one archive, made by the worker. */
export const exportResponse = z.object({
  id: z.uuid(),
  createdAt: z.iso.datetime(),
  state: z.enum(exportStates),
  /** 0–1 */
  progress: z.number().min(0).max(1),
  /** One sentence where it failed. */
  reason: z.string().nullable(),
  /** Null until it is made. */
  file: z.object({ name: z.string(), bytes: z.int().positive(), expiresAt: z.iso.datetime() }).nullable(),
});
export type ExportResponse = z.infer<typeof exportResponse>;

export const myExportResponse = z.object({
  /** The newest; null where there is none. */
  export: exportResponse.nullable(),
  /** What a new one would hold. */
  holds: z.object({
    takes: z.int().nonnegative(),
    rooms: z.int().nonnegative(),
    notes: z.int().nonnegative(),
    bytes: z.int().nonnegative(),
  }),
});
export type MyExportResponse = z.infer<typeof myExportResponse>;
