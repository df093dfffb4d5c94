import { z } from 'zod';
import { findingStatus, type FindingTopic } from './reports';
import { text, textOfLines } from './text';

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

const tag = text()
  .min(1)
  .max(30, 'A tag has at most 30 characters.')
  .regex(/^[^,]+$/, 'A tag has no comma in it.');
const tags = z
  .array(tag)
  .max(10, 'A take has at most 10 tags.')
  .transform((all) => [...new Set(all)]);
const actionIds = z.array(text().max(60)).max(40);
const title = text().max(120, 'A title has at most 120 characters.');
const note = textOfLines().max(4000, 'A note has at most 4,000 characters.');

const dayMs = 24 * 60 * 60 * 1000;
/** Until tomorrow: a recorder's clock may be set to another zone. */
const recordedAt = z.iso
  .datetime({ offset: true })
  .refine(
    (told) => Date.parse(told) >= 0 && Date.parse(told) <= Date.now() + dayMs,
    'A take was recorded between 1970 and today.',
  );

/** The text fields of the upload; they are sent before the files. `tracks` travels as JSON text. */
export const createTakeRequest = z.object({
  /** Made by the client once per upload: sending the same key again gives the same take. */
  uploadKey: z.uuid(),
  title: title.default(''),
  note: note.default(''),
  recordedAt: recordedAt.optional(),
  /** The player's earlier take that this one follows. */
  followsTakeId: z.uuid().optional(),
  /** The player's setup it was recorded with. */
  setupId: z.uuid().optional(),
  /** The player's room it was recorded in. */
  roomId: z.uuid().optional(),
  /** Which actions of that take were carried out before this one; travels as JSON text. */
  doneActions: actionIds.default([]),
  /** Travels as JSON text. */
  tags: tags.default([]),
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

/** PATCH: absent leaves as it is, null clears. */
export const updateTakeRequest = z.object({
  title: title.optional(),
  note: note.optional(),
  /** Ids of the actions under "before the next take" that are ticked. */
  tickedActions: actionIds.optional(),
  tags: tags.optional(),
  /** One of the player's setups. */
  setupId: z.uuid().nullable().optional(),
  roomId: z.uuid().nullable().optional(),
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

/** What the recorder wrote into a file (`bext`, EBU Tech 3285); null where it wrote nothing that can be so. */
export const broadcastFacts = z.object({
  description: z.string().max(256).nullable(),
  originator: z.string().max(32).nullable(),
  /** By the recorder's clock, in its own time zone. */
  date: z.iso.date().nullable(),
  time: z.iso.time().nullable(),
  /** Where the first sample lies, in samples since midnight. */
  timeReferenceSamples: z.int().nonnegative().nullable(),
});

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
  broadcast: broadcastFacts.nullable(),
});
export type TakeFileResponse = z.infer<typeof takeFileResponse>;

/** A sheet of an earlier version of the measurements: nothing to do, or on its way to the new one, or that failed. */
export const renewals = ['none', 'waiting', 'failed'] as const;

/** One of a take's reports: each version of the measurements makes at most one. */
export const sheetVersion = z.object({ version: z.string(), measuredAt: z.iso.datetime() });
export type SheetVersion = z.infer<typeof sheetVersion>;

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
  /** Every version there is, the one the sheet shows first, then from new to old; only its player is told. */
  sheetVersions: z.array(sheetVersion),
  /** Whether the sheet is measured again, in the background, with a newer version of the measurements. */
  renewal: z.enum(renewals),
  tickedActions: z.array(z.string()),
  tags: z.array(z.string()),
  /** The take this one follows, while it is there. */
  follows: z.object({ id: z.uuid(), number: z.int().positive(), title: z.string() }).nullable(),
  /** The take that was added after this one, if any: Big print goes on to it. */
  followedBy: z.object({ id: z.uuid(), number: z.int().positive() }).nullable(),
  /** What it was recorded with, for its player. */
  setup: z.object({ id: z.uuid(), name: z.string() }).nullable(),
  /** Where it was recorded, for its player. */
  room: z.object({ id: z.uuid(), name: z.string() }).nullable(),
  /** What the one who asks may do. */
  rights: z.object({ change: z.boolean(), listen: z.boolean(), download: z.boolean() }),
  /** Who recorded it, as others see them. */
  player: z.string(),
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
  tags: z.array(z.string()),
  /** Notes on its sheet, and those of them that others wrote since the player looked last. */
  notes: z.int().nonnegative(),
  newNotes: z.int().nonnegative(),
  /** Set for takes that were deleted and can still be brought back; they go for good after 30 days. */
  deletedAt: z.iso.datetime().nullable(),
});
export type TakeListItem = z.infer<typeof takeListItem>;

/** Findings a list can be asked for by themselves; levels and adding up have filters of their own. */
export const topicFilters = [
  'noise',
  'hum',
  'dc-offset',
  'flattened',
  'overs',
  'dropouts',
  'late-start',
  'arrival',
  'balance',
  'files',
] as const satisfies readonly FindingTopic[];

/** The filter sentence: "Show **every take** tagged **any tag**, **newest first**." */
export const takeFilters = [
  'every',
  'good',
  'clipped',
  'hot',
  'low',
  'to-flip',
  ...topicFilters,
  'cannot-tell',
  'deleted',
] as const;
export const takeOrders = ['newest', 'oldest', 'hardest-kick', 'fullest-low-end'] as const;

export const listTakesRequest = z.object({
  show: z.enum(takeFilters).default('every'),
  order: z.enum(takeOrders).default('newest'),
  tag: text().max(30).optional(),
  /** Takes recorded with this setup. */
  setup: z.uuid().optional(),
  /** Words looked for in title, note and what the sheet says. */
  find: text().max(100).optional(),
  cursor: z.string().max(200).optional(),
  limit: z.coerce.number().int().min(1).max(100).default(11),
});
export type ListTakesRequest = z.infer<typeof listTakesRequest>;

export const listTakesResponse = z.object({
  items: z.array(takeListItem),
  /** Null on the last page. */
  nextCursor: z.string().nullable(),
  /** Takes that fit the sentence. */
  total: z.int().nonnegative(),
  /** The player's takes in all, deleted ones not counted. */
  everyTotal: z.int().nonnegative(),
  deletedTotal: z.int().nonnegative(),
  /** Every tag the player uses, in alphabetical order. */
  tags: z.array(z.string()),
  /** Every setup the player's takes were recorded with, by name. */
  setups: z.array(z.object({ id: z.uuid(), name: z.string() })),
});
export type ListTakesResponse = z.infer<typeof listTakesResponse>;

/** Files that are about to be sent, by what is in them: SHA-256, with commas between. */
export const sameFilesRequest = z.object({
  sha256: z
    .string()
    .regex(
      /^[0-9a-f]{64}(,[0-9a-f]{64}){0,9}$/,
      'Name one to ten files by their SHA-256, with commas between.',
    )
    .transform((hashes) => hashes.split(',')),
});
export type SameFilesRequest = z.output<typeof sameFilesRequest>;

/** The player's newest take that each of them is in; files that are new are not among them. */
export const sameFilesResponse = z.object({
  items: z.array(
    z.object({
      sha256: z.string().length(64),
      take: z.object({ id: z.uuid(), number: z.int().positive(), title: z.string() }),
    }),
  ),
});
export type SameFilesResponse = z.infer<typeof sameFilesResponse>;

/**
 * A short stretch of every track as little-endian float32, one track after the other in the order kick, overhead.
 * Headers: `X-Sample-Rate-Hz`, `X-Start-Frame`, `X-Frames`, `X-Tracks`.
 */
export const excerptRequest = z.object({
  startS: z.coerce.number().min(0).max(86_400),
  durationS: z.coerce.number().positive().max(2, 'An excerpt has at most 2 seconds.'),
});
export type ExcerptRequest = z.infer<typeof excerptRequest>;

export const uploadLimits = {
  maxFileBytes: 512 * 1024 * 1024,
  maxFiles: 2,
} as const;

/**
 * Outline of a track for the whole-take picture: little-endian int8, for each step the lowest and the highest sample
 * (−127 … 127 is full scale), one track after the other in the order kick, overhead. The server picks the resolution
 * that has at least `steps` steps where the take is long enough. Headers: `X-Steps`, `X-Tracks`, `X-Duration-S`.
 */
export const peaksRequest = z.object({ steps: z.coerce.number().int().min(100).max(8000).default(1500) });
export type PeaksRequest = z.infer<typeof peaksRequest>;
