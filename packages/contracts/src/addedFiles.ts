import { z } from 'zod';

/** More than any two microphones at one kit are apart, and any balance that makes sense. */
export const addedFileLimits = { mostShiftMs: 20, leastGainDb: -40, mostGainDb: 60, mostOfTake: 12 } as const;

const { mostShiftMs, leastGainDb, mostGainDb } = addedFileLimits;

/** With which choice the two microphones are added: what the sentence on the sheet says. */
export const makeAddedFileRequest = z.strictObject({
  flipped: z.boolean(),
  /** Positive plays the overhead earlier. */
  shiftMs: z
    .number()
    .min(-mostShiftMs, `A shift is at most ${mostShiftMs} ms either way.`)
    .max(mostShiftMs, `A shift is at most ${mostShiftMs} ms either way.`),
  /** Positive plays the overhead louder. */
  gainDb: z
    .number()
    .min(leastGainDb, `The overhead can be at most ${-leastGainDb} dB quieter.`)
    .max(mostGainDb, `The overhead can be at most ${mostGainDb} dB louder.`),
});
export type MakeAddedFileRequest = z.infer<typeof makeAddedFileRequest>;

export const addedFileStates = ['queued', 'running', 'done', 'failed'] as const;

export const addedFileResponse = z.object({
  id: z.uuid(),
  createdAt: z.iso.datetime(),
  choice: z.object({ flipped: z.boolean(), shiftMs: z.number(), gainDb: z.number() }),
  state: z.enum(addedFileStates),
  /** 0–1 */
  progress: z.number().min(0).max(1),
  /** One sentence where it failed. */
  reason: z.string().nullable(),
  /** Null until it is made. */
  file: z
    .object({
      name: z.string(),
      bytes: z.int().positive(),
      sha256: z.string().length(64),
      durationS: z.number().nonnegative(),
      /** How far it was turned down so that its true peak stays at or below −1 dBTP; 0 or less. */
      levelDb: z.number().max(0),
      /** Null for silence. */
      truePeakDbtp: z.number().nullable(),
      /** How far it is turned down when heard, so that it is no louder than the two as recorded; 0 or less. */
      listenGainDb: z.number().max(0),
    })
    .nullable(),
});
export type AddedFileResponse = z.infer<typeof addedFileResponse>;

/** Newest first. */
export const listAddedFilesResponse = z.object({ items: z.array(addedFileResponse) });
export type ListAddedFilesResponse = z.infer<typeof listAddedFilesResponse>;
