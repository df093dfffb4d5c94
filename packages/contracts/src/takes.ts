import { z } from 'zod';
import { findingStatus } from './reports';

export const trackRoles = ['kick', 'overhead'] as const;
export const trackRole = z.enum(trackRoles);
export type TrackRole = z.infer<typeof trackRole>;

/** Which channel of which file was which microphone. */
export const uploadTrack = z.object({
  role: trackRole,
  fileIndex: z.int().min(0).max(1),
  channel: z.int().min(0).max(31),
});
export type UploadTrack = z.infer<typeof uploadTrack>;

/** The text fields of the upload; they are sent before the files. `tracks` travels as JSON text. */
export const createTakeRequest = z.object({
  /** Made by the client once per upload: sending the same key again gives the same take. */
  uploadKey: z.uuid(),
  title: z.string().trim().max(120, 'A title has at most 120 characters.').default(''),
  note: z.string().trim().max(4000, 'A note has at most 4,000 characters.').default(''),
  recordedAt: z.iso.datetime({ offset: true }).optional(),
  tracks: z
    .array(uploadTrack)
    .length(2, 'A take has one kick microphone and one overhead microphone.')
    .refine((t) => new Set(t.map((x) => x.role)).size === t.length, 'One microphone cannot be there twice.')
    .refine(
      (t) => new Set(t.map((x) => `${x.fileIndex}:${x.channel}`)).size === t.length,
      'The kick and the overhead are the same channel of the same file.',
    ),
});
export type CreateTakeRequest = z.infer<typeof createTakeRequest>;

/** PATCH: absent leaves as it is. */
export const updateTakeRequest = z.object({
  title: z.string().trim().max(120, 'A title has at most 120 characters.').optional(),
  note: z.string().trim().max(4000, 'A note has at most 4,000 characters.').optional(),
  /** Ids of the actions under "before the next take" that are ticked. */
  tickedActions: z.array(z.string().max(60)).max(40).optional(),
});
export type UpdateTakeRequest = z.infer<typeof updateTakeRequest>;

export const measurementStates = ['queued', 'running', 'done', 'failed', 'cancelled'] as const;
/** In the order they are walked; a reader sees "step 3 of 5". */
export const measurementStages = ['fetching', 'levels', 'hits', 'arrival', 'adding-up'] as const;

export const measurementResponse = z.object({
  state: z.enum(measurementStates),
  stage: z.enum(measurementStages).nullable(),
  /** 0–1 over the whole measurement. */
  progress: z.number().min(0).max(1),
  attempt: z.int().nonnegative(),
  /** One sentence for people where the state is `failed`. */
  reason: z.string().nullable(),
});
export type MeasurementResponse = z.infer<typeof measurementResponse>;

export const takeFileResponse = z.object({
  id: z.uuid(),
  name: z.string(),
  bytes: z.int().nonnegative(),
  sha256: z.string().length(64),
  /** Such as `24-bit PCM` or `32-bit float`. */
  encoding: z.string(),
  sampleRateHz: z.int().positive(),
  channels: z.int().positive(),
  durationS: z.number().nonnegative(),
});
export type TakeFileResponse = z.infer<typeof takeFileResponse>;

export const takeResponse = z.object({
  id: z.uuid(),
  /** Counts a player's takes from 1. */
  number: z.int().positive(),
  title: z.string(),
  note: z.string(),
  recordedAt: z.iso.datetime(),
  createdAt: z.iso.datetime(),
  files: z.array(takeFileResponse),
  tracks: z.array(z.object({ role: trackRole, fileId: z.uuid(), channel: z.int().nonnegative() })),
  measurement: measurementResponse,
  hasReport: z.boolean(),
  tickedActions: z.array(z.string()),
});
export type TakeResponse = z.infer<typeof takeResponse>;

export const takeListItem = z.object({
  id: z.uuid(),
  number: z.int().positive(),
  title: z.string(),
  recordedAt: z.iso.datetime(),
  measurement: measurementResponse,
  /** What the sheet says in one short sentence; null until measured. */
  summary: z.object({ status: findingStatus, strong: z.string(), rest: z.string() }).nullable(),
  /** Hardest hit of each microphone, dBFS; null where there is none or it clipped. */
  kickPeakDbfs: z.number().nullable(),
  kickClipped: z.boolean(),
  overheadPeakDbfs: z.number().nullable(),
  overheadClipped: z.boolean(),
  /** Low end of the two added as recorded, matched levels, against no help and no harm; dB, at most +3.01. */
  lowEndDb: z.number().nullable(),
});
export type TakeListItem = z.infer<typeof takeListItem>;

export const listTakesRequest = z.object({
  cursor: z.string().max(200).optional(),
  limit: z.coerce.number().int().min(1).max(100).default(11),
});
export type ListTakesRequest = z.infer<typeof listTakesRequest>;

export const listTakesResponse = z.object({
  items: z.array(takeListItem),
  /** Null on the last page. */
  nextCursor: z.string().nullable(),
  total: z.int().nonnegative(),
});
export type ListTakesResponse = z.infer<typeof listTakesResponse>;

/**
 * A short stretch of every track as little-endian float32, one track after the other in the order kick, overhead.
 * Headers: `X-Sample-Rate-Hz`, `X-Start-Frame`, `X-Frames`, `X-Tracks`.
 */
export const excerptRequest = z.object({
  startS: z.coerce.number().min(0).max(86_400),
  durationS: z.coerce.number().positive().max(10),
});
export type ExcerptRequest = z.infer<typeof excerptRequest>;

export const uploadLimits = {
  maxFileBytes: 512 * 1024 * 1024,
  maxFiles: 2,
} as const;
