import type { Interval } from './interval';
import type { WorthStep } from './takeChange';
import type { KickHitTold, TakeSide } from './takeSide';
import type { Uncertain } from './uncertain';

export type ComparedKey =
  | 'low-end'
  | 'hardest-kick'
  | 'hardest-overhead'
  | 'cymbals-over-drums'
  | 'arrival'
  | 'noise-kick'
  | 'noise-overhead'
  | 'evenness'
  | 'attack'
  | 'decay-500'
  | 'decay-1000'
  | 'decay-2000'
  | 'decay-4000'
  | 'early-to-late'
  | 'overhead-63'
  | 'overhead-125'
  | 'brightness';

/**
 * `too-few-hits`: not six a side; `strength-unmatched`: the preamps aren't known to have stood alike, or too few hits of
 * one take are as hard as the other's; `cannot-tell`: one of the takes doesn't hold it; `not-measured`: one was measured
 * before it was.
 */
export type ComparedReason = 'too-few-hits' | 'strength-unmatched' | 'cannot-tell' | 'not-measured';

export type ChangeWord =
  | 'higher'
  | 'lower'
  | 'longer'
  | 'shorter'
  | 'noisier'
  | 'quieter'
  | 'fuller'
  | 'thinner'
  | 'less even'
  | 'more even'
  | 'brighter'
  | 'duller'
  | 'later'
  | 'earlier';

export type FigureUnit = 'dB' | 'dBFS' | 'ms' | 's';

/** One figure of two takes, side by side. */
export interface ComparedFigure {
  readonly key: ComparedKey;
  /** Of `before` and `after`. */
  readonly unit: FigureUnit;
  /** Null where it can't be told; too few hits still show one where there is one. */
  readonly before: number | null;
  readonly after: number | null;
  /** After minus before in their unit; where the step is a share, after over before minus 1. */
  readonly change: number | null;
  /** Where the change lies with 95 %, in the unit of `change`; null for figures of a whole take. */
  readonly interval95: Interval | null;
  /** What is worth mentioning, in the unit of `change`. */
  readonly step: WorthStep;
  /** True only where the change exceeds its step, and surely. */
  readonly clear: boolean;
  readonly reason: ComparedReason | null;
  /** Hits it was told from; null for figures of a whole take. */
  readonly hitsBefore: number | null;
  readonly hitsAfter: number | null;
  /** Only of a clear change. */
  readonly word: ChangeWord | null;
}

/** What is the same for a figure whatever the takes are. */
export interface FigureRule {
  readonly key: ComparedKey;
  readonly unit: FigureUnit;
  readonly step: WorthStep;
  readonly words: { readonly more: ChangeWord; readonly less: ChangeWord };
}

/** A figure over some hits of one take. */
export interface HitFigure {
  readonly hits: number;
  /** Null where these hits hold none. */
  readonly figure: (seed: number) => Uncertain | null;
}

export interface PerHitRule extends FigureRule {
  /** `any`: how hard the drum is hit, and the preamps, don't move it; `match-if-possible`: they hardly do. */
  readonly strength: 'must-match' | 'match-if-possible' | 'any';
  /**
   * @param kicks - hits struck alike in both takes where such are known, else all
   * @returns null where the facts are older than the figure
   */
  read(side: TakeSide, kicks: readonly KickHitTold[]): HitFigure | null;
}

export function untold({ key, unit, step }: FigureRule, reason: ComparedReason): ComparedFigure {
  const nothing = { before: null, after: null, change: null, interval95: null, clear: false, word: null };
  return { key, unit, step, ...nothing, reason, hitsBefore: null, hitsAfter: null };
}

export function wordOf(
  { words }: FigureRule,
  { change, clear }: { readonly change: number; readonly clear: boolean },
): ChangeWord | null {
  if (!clear) return null;
  return change > 0 ? words.more : words.less;
}
