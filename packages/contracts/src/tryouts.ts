import { z } from 'zod';
import { measurementResponse } from './takes';
import { text, textOfLines } from './text';

/** What differs from take to take; anything else is told in the player's own words. */
export const tryOutSubjects = [
  'overhead-height',
  'overhead-forward',
  'kick-depth',
  'kick-angle',
  'other',
] as const;
export type TryOutSubject = (typeof tryOutSubjects)[number];

/** Positions are numbers in one of these, or labels. */
export const tryOutUnits = ['cm', 'degree', 'dB', 'label'] as const;
export type TryOutUnit = (typeof tryOutUnits)[number];

export const tryOutLimits = { fewestTakes: 2, mostTakes: 24 } as const;

const position = z.number().min(-1000).max(1000).nullable();
const label = text().max(40, 'A position has at most 40 characters.');
const differs = text().max(80, 'What differs has at most 80 characters.');
const reason = textOfLines().max(1000, 'The reason has at most 1,000 characters.');

/** A take of the try-out: one that is there, or one that will be uploaded with this key. */
export const tryOutPlaceRequest = z
  .object({
    takeId: z.uuid().optional(),
    /** The key the take will be uploaded with, so that it is known which one it is whatever happens on the way. */
    uploadKey: z.uuid().optional(),
    /** Names of the files to come, so that they can be asked for again. */
    fileNames: z.array(text().max(255)).max(2).default([]),
    position: position.default(null),
    label: label.default(''),
  })
  .refine(({ takeId, uploadKey }) => (takeId === undefined) !== (uploadKey === undefined), {
    message: 'Name a take that is there, or the key of one to come.',
  });
export type TryOutPlaceRequest = z.input<typeof tryOutPlaceRequest>;

const about = { subject: z.enum(tryOutSubjects), differs, unit: z.enum(tryOutUnits) };

export const createTryOutRequest = z
  .object({
    ...about,
    differs: differs.default(''),
    places: z
      .array(tryOutPlaceRequest)
      .min(tryOutLimits.fewestTakes, 'A try-out has at least two takes.')
      .max(tryOutLimits.mostTakes, `A try-out has at most ${tryOutLimits.mostTakes} takes.`),
    /** Which of the places is how things stand now. */
    currentIndex: z.int().nonnegative().nullable().default(null),
  })
  .refine(({ subject, differs: words }) => subject !== 'other' || words !== '', {
    message: 'Say in a few words what differs.',
    path: ['differs'],
  });
export type CreateTryOutRequest = z.input<typeof createTryOutRequest>;

/** PATCH: absent leaves as it is, null clears. */
export const updateTryOutRequest = z.object({
  subject: about.subject.optional(),
  differs: differs.optional(),
  unit: about.unit.optional(),
  reason: reason.optional(),
  winnerPlaceId: z.uuid().nullable().optional(),
  currentPlaceId: z.uuid().nullable().optional(),
});
export type UpdateTryOutRequest = z.input<typeof updateTryOutRequest>;

/** The winner becomes how things stand: its setup, copied with what was varied. */
export const makeTryOutSetupRequest = z.object({ winnerPlaceId: z.uuid(), reason });
export type MakeTryOutSetupRequest = z.input<typeof makeTryOutSetupRequest>;

/** More takes of a try-out that is there. */
export const addTryOutPlacesRequest = z.object({
  places: z.array(tryOutPlaceRequest).min(1, 'Name at least one take.').max(tryOutLimits.mostTakes),
});
export type AddTryOutPlacesRequest = z.input<typeof addTryOutPlacesRequest>;

export const updateTryOutPlaceRequest = z.object({
  position: position.optional(),
  label: label.optional(),
});
export type UpdateTryOutPlaceRequest = z.input<typeof updateTryOutPlaceRequest>;

export const tryOutPlaceResponse = z.object({
  id: z.uuid(),
  uploadKey: z.uuid(),
  /** Null until it is uploaded. */
  take: z
    .object({
      id: z.uuid(),
      number: z.int().positive(),
      title: z.string(),
      recordedAt: z.iso.datetime(),
      measurement: measurementResponse,
      hasReport: z.boolean(),
    })
    .nullable(),
  fileNames: z.array(z.string()),
  position: z.number().nullable(),
  label: z.string(),
});
export type TryOutPlaceResponse = z.infer<typeof tryOutPlaceResponse>;

const winnerSetup = z.object({
  id: z.uuid(),
  name: z.string(),
  /** The setup it is a copy of. */
  copiedFrom: z.object({ id: z.uuid(), name: z.string() }).nullable(),
  /** Whether the next upload begins with it. */
  isCurrent: z.boolean(),
});

export const tryOutResponse = z.object({
  id: z.uuid(),
  createdAt: z.iso.datetime(),
  subject: z.enum(tryOutSubjects),
  differs: z.string(),
  unit: z.enum(tryOutUnits),
  /** Why the winner won, in the player's words. */
  reason: z.string(),
  winnerPlaceId: z.uuid().nullable(),
  currentPlaceId: z.uuid().nullable(),
  /** What the winner was made to; null before, and after it was undone. */
  winnerSetup: winnerSetup.nullable(),
  places: z.array(tryOutPlaceResponse),
});
export type TryOutResponse = z.infer<typeof tryOutResponse>;

export const tryOutListItem = tryOutResponse
  .omit({ places: true, reason: true, winnerSetup: true })
  .extend({ takeCount: z.int().nonnegative(), winner: tryOutPlaceResponse.nullable() });
export type TryOutListItem = z.infer<typeof tryOutListItem>;

export const listTryOutsResponse = z.object({ items: z.array(tryOutListItem) });
export type ListTryOutsResponse = z.infer<typeof listTryOutsResponse>;

export const tryOutMeasures = ['low-end', 'agreement', 'bleed', 'evenness', 'attack'] as const;
export type TryOutMeasure = (typeof tryOutMeasures)[number];
/** How each take's overhead is played: by the polarity that gives more low end, as it was, or turned over. */
export const tryOutPolarities = ['best-polarity', 'as-recorded', 'flipped'] as const;
export type TryOutPolarity = (typeof tryOutPolarities)[number];

export const tryOutRankingRequest = z.object({
  measure: z.enum(tryOutMeasures).default('low-end'),
  polarity: z.enum(tryOutPolarities).default('best-polarity'),
  /** Counts half: both are told in steps worth mentioning and added. */
  also: z.enum(tryOutMeasures).optional(),
});
export type TryOutRankingRequest = z.input<typeof tryOutRankingRequest>;

const interval = z.object({ low: z.number(), high: z.number() });

export const tryOutRankingRow = z.object({
  placeId: z.uuid(),
  /** In the ranking's unit; null with a reason. A figure with a reason is shown, not ranked. */
  value: z.number().nullable(),
  interval95: interval.nullable(),
  /** 1 for the best; null where it can't be ranked. */
  rank: z.int().positive().nullable(),
  /** This value minus the best's. */
  fromBest: z.number().nullable(),
  /** Told from the interval of the difference, not from overlapping intervals. */
  standing: z.enum(['best', 'as-good', 'worse']).nullable(),
  /** "fullest", "no clear difference", "clearly thinner". */
  word: z.string().nullable(),
  reason: z.enum(['too-few-hits', 'strength-unmatched', 'cannot-tell', 'not-measured']).nullable(),
  /** Hits it was told from. */
  hits: z.int().nonnegative(),
  /** Whether the overhead is flipped for this figure, and when it is heard. */
  flipped: z.boolean(),
  cymbalsOverDrumsDb: z.number().nullable(),
  /** The takes are heard from their first kick hit on, so that it is the same bar in each. */
  heard: z.object({
    firstKickS: z.number().nonnegative(),
    durationS: z.number().nonnegative(),
    sampleRateHz: z.number().positive(),
    /** Brings the two microphones to matched levels, as the figures are told. */
    overheadGainDb: z.number(),
  }),
});
export type TryOutRankingRow = z.infer<typeof tryOutRankingRow>;

/** Of the takes that are measured: best first, what can't be ranked last. */
export const tryOutRankingResponse = z.object({
  measure: z.enum(tryOutMeasures),
  polarity: z.enum(tryOutPolarities),
  also: z.enum(tryOutMeasures).nullable(),
  /** Two measures are told in steps worth mentioning. */
  unit: z.enum(['dB', '', 'steps']),
  /** A step worth mentioning. */
  step: z.number().positive(),
  higherIsBetter: z.boolean(),
  rows: z.array(tryOutRankingRow),
});
export type TryOutRankingResponse = z.infer<typeof tryOutRankingResponse>;
