import { z } from 'zod';
import { finding, lineSentence } from './reports';

const figure = z.number().nullable();

/** A take as a comparison names it. */
export const comparedTake = z.object({
  id: z.uuid(),
  number: z.int().positive(),
  title: z.string(),
  recordedAt: z.iso.datetime(),
  /** Whether the one who asks may hear it. */
  canListen: z.boolean(),
});
export type ComparedTake = z.infer<typeof comparedTake>;

/** One row of "what differed": empty where nothing was noted on that side. */
export const differedRow = z.object({ what: z.string(), before: z.string(), after: z.string() });
export type DifferedRow = z.infer<typeof differedRow>;

export const seenPolarities = ['flipped', 'as-before', 'cannot-tell'] as const;

/** Polarity from one take to the other: what was noted, what the sound says, and what it did to the low end. */
export const comparedPolarity = z.object({
  /** Whether a flip was written down. */
  noted: z.boolean(),
  /** What the pair spectra alone say. */
  seen: z.enum(seenPolarities),
  /** Whether the sound says what was noted; null where it can't tell. */
  confirmed: z.boolean().nullable(),
  /** Empty where nothing was noted and nothing turned over. */
  sentence: z.string(),
  /** Low end (30–150 Hz) of the two added as recorded, matched levels, against their power sum; dB, at most +3.01. */
  beforeDb: figure,
  afterDb: figure,
  /** Where a flip of the take before should have led; null where no flip is seen. */
  expectedDb: figure,
});
export type ComparedPolarity = z.infer<typeof comparedPolarity>;

export const comparedFigureKeys = [
  'low-end',
  'hardest-kick',
  'hardest-overhead',
  'cymbals-over-drums',
  'arrival',
  'noise-kick',
  'noise-overhead',
  'evenness',
  'attack',
  'overhead-63',
  'overhead-125',
  'decay-500',
  'decay-1000',
  'decay-2000',
  'decay-4000',
  'early-to-late',
  'brightness',
] as const;

/** How one figure changed, and how surely. */
export const comparedFigure = z.object({
  key: z.enum(comparedFigureKeys),
  label: z.string(),
  /** Of `before` and `after`. */
  unit: z.enum(['dB', 'dBFS', 'ms', 's']),
  decimals: z.int().min(0).max(2),
  before: figure,
  after: figure,
  /** After minus before in the figure's own unit; for a share, after over before minus 1. Null with a reason. */
  change: figure,
  /** Where the change lies with 95 %; null for figures of the whole take. */
  interval95: z.object({ low: z.number(), high: z.number() }).nullable(),
  /** What is worth mentioning, in the unit of `change`. */
  step: z.number().positive(),
  /** True where `change`, its interval and its step are shares, not differences. */
  isShare: z.boolean(),
  /** True only where the interval excludes no change and the change exceeds its step. */
  clear: z.boolean(),
  reason: z.string().nullable(),
  hitsBefore: z.int().nonnegative().nullable(),
  hitsAfter: z.int().nonnegative().nullable(),
  /** Such as "fuller"; null where nothing changed clearly. */
  word: z.string().nullable(),
});
export type ComparedFigure = z.infer<typeof comparedFigure>;

/** A caution about the comparison itself, for the margin. */
export const comparisonCaveat = z.object({ about: z.string(), text: z.string() });
export type ComparisonCaveat = z.infer<typeof comparisonCaveat>;

export const comparisonResponse = z.object({
  before: comparedTake,
  after: comparedTake,
  /** What the page opens with. */
  line: z.array(lineSentence),
  differed: z.array(differedRow),
  /** What was noted of both and is the same; empty where nothing was. */
  same: z.string(),
  polarity: comparedPolarity,
  /** By topic, what each take's sheet says. */
  findings: z.array(
    z.object({ topic: finding.shape.topic, before: finding.nullable(), after: finding.nullable() }),
  ),
  figures: z.array(comparedFigure),
  caveats: z.array(comparisonCaveat),
});
export type ComparisonResponse = z.infer<typeof comparisonResponse>;
