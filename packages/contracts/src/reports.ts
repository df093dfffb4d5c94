import { z } from 'zod';
import { target } from './accounts';

/** Null means "cannot be told"; the field `…Reason` beside it, where there is one, says why. */
const figure = z.number().nullable();

export const findingStatuses = ['good', 'watch', 'fix', 'cannot-tell'] as const;
export const findingStatus = z.enum(findingStatuses);
export type FindingStatus = z.infer<typeof findingStatus>;

export const levels = ['clipped', 'hot', 'on-target', 'low'] as const;
export const verdicts = ['keep', 'flip', 'either-way', 'cannot-tell'] as const;
export const verdict = z.enum(verdicts);
export type Verdict = z.infer<typeof verdict>;
export const hitKinds = ['kick', 'drum', 'cymbal', 'mixed'] as const;
export const choiceNames = ['as-recorded', 'flipped', 'shifted', 'shifted-flipped', 'best-shift'] as const;

export const clipRun = z.object({
  startSample: z.int().nonnegative(),
  lengthSamples: z.int().positive(),
  levelDbfs: z.number(),
});

export const trackReport = z.object({
  samplePeakDbfs: figure,
  samplePeakAtS: figure,
  /** BS.1770-5 Annex 2. Null in a take measured before it was, as `integratedLufs`. */
  truePeakDbtp: figure,
  headroomDb: figure,
  rmsDbfs: figure,
  crestFactorDb: figure,
  /** BS.1770-5, gated, one channel of weight 1. */
  integratedLufs: figure,
  /** The first 200 runs; `runCount` and `clippedSamples` count all. */
  clipping: z.object({
    runs: z.array(clipRun),
    runCount: z.int().nonnegative(),
    clippedSamples: z.int().nonnegative(),
  }),
  /** Tops look squashed without standing still: never called clipped. Null in a take measured before it was. */
  looksFlattened: z.boolean().nullable(),
  /** Where samples seem to be missing. Null in a take measured before it was. */
  dropouts: z.object({ count: z.int().nonnegative(), firstAtS: figure }).nullable(),
  /** Mean of all samples, linear, full scale 1. */
  dcOffset: z.number(),
  noiseFloorDbfs: figure,
  noiseFloorReason: z.string().nullable(),
  /** RMS of the mains' multiples in the quiet stretch. Null: no hum, no quiet stretch, or measured before it was. */
  hum: z.object({ mainsHz: z.union([z.literal(50), z.literal(60)]), levelDbfs: z.number() }).nullable(),
  /** Peak of the loudest hit in this microphone's file. */
  loudestHitDbfs: figure,
  level: z.enum(levels).nullable(),
  /** What to turn the preamp by so that the loudest hit reaches the aim; when clipped, at least this far down. */
  gainChangeDb: figure,
});
export type TrackReport = z.infer<typeof trackReport>;

export const hit = z.object({
  timeS: z.number().nonnegative(),
  kind: z.enum(hitKinds),
  kickPeakDbfs: figure,
  overheadPeakDbfs: figure,
});
export type Hit = z.infer<typeof hit>;

export const arrival = z.object({
  /** Positive: the overhead hears the kick later. */
  arrivalMs: figure,
  arrivalSamples: figure,
  arrivalIqrMs: figure,
  hitsUsed: z.int().nonnegative(),
  /** "About": arrival times the speed of sound at the reader's temperature. */
  pathDifferenceM: figure,
  confidence: z.number().min(0).max(1),
  /** Direction of each microphone's first swing at the kick. */
  firstSwing: z.object({
    kick: z.enum(['up', 'down']).nullable(),
    overhead: z.enum(['up', 'down']).nullable(),
  }),
  reason: z.string().nullable(),
});
export type Arrival = z.infer<typeof arrival>;

/** The two files don't start together: arrival and polarity can't be told until they do. */
export const lateStart = z.object({
  /** Positive: the overhead's file runs late, so it is to be played this much earlier. Within 5 ms. */
  overheadLateMs: z.number(),
  /** How alike what is struck in both is once they line up. */
  likeness: z.number().min(0).max(1),
});
export type LateStart = z.infer<typeof lateStart>;

export const choice = z.object({
  name: z.enum(choiceNames),
  flipped: z.boolean(),
  /** Positive: the overhead is played this much earlier. */
  shiftMs: z.number(),
  /** Low end (30–150 Hz) of the two added, matched levels, against their power sum; dB, at most +3.01. */
  lowEndDb: z.number(),
  /** The third-octave (31.5–800 Hz) that loses most against the power sum with this choice. */
  deepest: z.object({ centreHz: z.number(), levelDb: z.number() }).nullable(),
});
export type Choice = z.infer<typeof choice>;

export const agreement = z.object({
  /** Σ Re Sko / √(Σ Skk · Σ Soo), 30–150 Hz; −1 … +1. */
  lowCorrelation: figure,
  flipGainRecordedDb: figure,
  flipGainMatchedDb: figure,
  /** What the overhead is turned up by for "levels matched". */
  matchGainDb: figure,
  hitsUsed: z.int().nonnegative(),
  /** Hits whose own low end says the same as the sum over hits. */
  agreeingHits: z.int().nonnegative(),
  /** 0–1: coherence over the kick hits, 30–150 Hz; null without hits and in a take measured before it was. */
  hitsAlike: figure,
  verdict,
  sure: z.boolean(),
  reason: z.string().nullable(),
  /** The flip's effect in three low bands, matched levels. */
  bands: z.array(z.object({ lowHz: z.number(), highHz: z.number(), flipGainDb: z.number() })),
  /** The same verdict with an 80 Hz, 12 dB/octave low cut on the overhead. */
  lowCut: z.object({ flipGainMatchedDb: z.number(), verdict }).nullable(),
  /** Third-octaves that a flip would move the other way by 1.5 dB or more. */
  contraryBands: z.array(z.object({ centreHz: z.number(), flipGainDb: z.number() })),
  choices: z.array(choice),
});
export type Agreement = z.infer<typeof agreement>;

export const balance = z.object({
  /** K-weighted over 400 ms in the overhead, median over hits that stand alone; null below five of a kind. */
  drumsLufs: figure,
  cymbalsLufs: figure,
  /** Cymbals minus drums. */
  differenceDb: figure,
  drumHits: z.int().nonnegative(),
  cymbalHits: z.int().nonnegative(),
  reason: z.string().nullable(),
});
export type Balance = z.infer<typeof balance>;

/** Median over hits and the distance between the quartiles. */
const spreadFigure = z.object({ median: z.number(), iqr: z.number().nonnegative() }).nullable();

export const room = z.object({
  /** Loud snare hits that were looked at. */
  snareHits: z.int().nonnegative(),
  /** How they die away: mean of the 500 Hz and 1 kHz octaves, seconds per 60 dB. */
  decayS: figure,
  /** The same of the first 10 dB. */
  earlyS: figure,
  bands: z.array(
    z.object({
      centreHz: z.number().positive(),
      /** From −5 to −25 dB, seconds per 60 dB. */
      t20S: spreadFigure,
      /** From 0 to −10 dB, seconds per 60 dB. */
      earlyS: spreadFigure,
      /** Energy of the first 50 ms over all that comes later. */
      earlyToLateDb: spreadFigure,
    }),
  ),
  reason: z.string().nullable(),
});
export type Room = z.infer<typeof room>;

export const findingTopics = [
  'files',
  'late-start',
  'kick-level',
  'overhead-level',
  'noise',
  'hum',
  'dc-offset',
  'flattened',
  'overs',
  'dropouts',
  'arrival',
  'adding-up',
  'balance',
  'room',
] as const;
export const findingTopic = z.enum(findingTopics);
export type FindingTopic = z.infer<typeof findingTopic>;

export const finding = z.object({
  topic: findingTopic,
  status: findingStatus,
  /** At most 25 words. */
  sentence: z.string(),
  why: z.string(),
  next: z.string(),
});
export type Finding = z.infer<typeof finding>;

/** One sentence of the line: what to do (heavy), then why (light). */
export const lineSentence = z.object({ action: z.string(), reason: z.string() });
export type LineSentence = z.infer<typeof lineSentence>;

/** One tick box under "before the next take". */
export const nextAction = z.object({
  id: z.string(),
  action: z.string(),
  detail: z.string(),
  /** True where the thing to do is to leave something alone. */
  leave: z.boolean(),
});
export type NextAction = z.infer<typeof nextAction>;

/** What became of one action of the take before: "**The flip worked:** 1.3 dB of low end came back; we expected 1.4." */
export const outcome = z.object({
  actionId: z.string(),
  status: findingStatus,
  strong: z.string(),
  rest: z.string(),
});
export type Outcome = z.infer<typeof outcome>;

export const reportFigures = z.object({
  /** 1: of a take measured before everything here was; what is missing is null. */
  version: z.union([z.literal(1), z.literal(2)]),
  sampleRateHz: z.number().positive(),
  durationS: z.number().nonnegative(),
  kick: trackReport,
  overhead: trackReport,
  hits: z.array(hit),
  /** Null where the files start together, and in a take measured before it was looked at. */
  lateStart: lateStart.nullable(),
  arrival,
  agreement,
  /** Null in a take measured before it was. */
  balance: balance.nullable(),
  room: room.nullable(),
  findings: z.array(finding),
});
/** What the command line prints. */
export type ReportFigures = z.infer<typeof reportFigures>;

/** Which version of the measurements; the current report without. The pair spectrum goes with it. */
export const reportRequest = z.object({ version: z.string().max(40).optional() });
export type ReportRequest = z.infer<typeof reportRequest>;

export const reportResponse = reportFigures.extend({
  takeId: z.uuid(),
  dspVersion: z.string(),
  measuredAt: z.iso.datetime(),
  target,
  temperatureC: z.number(),
  line: z.array(lineSentence),
  actions: z.array(nextAction),
  /** Empty unless this take follows one whose actions were ticked, and both are measured. */
  outcomes: z.array(outcome),
  /**
   * Layout of `GET /api/takes/:id/pair-spectrum`: little-endian float32, `binCount` values each of
   * Skk, Soo, Re Sko, Im Sko; bin i lies at i · binHz. Null where no kick hit was found.
   */
  pairSpectrum: z
    .object({ binHz: z.number().positive(), binCount: z.int().positive(), hitCount: z.int().positive() })
    .nullable(),
});
export type ReportResponse = z.infer<typeof reportResponse>;
