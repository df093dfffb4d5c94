/** How one choice is to be played: the second microphone against the first. */
export interface MixChoice {
  flipped: boolean;
  /** Positive plays the overhead earlier. */
  shiftMs: number;
  gainDb: number;
  /** Brings the choices to one level above the low end; 0 or below, the louder one is turned down. */
  matchDb: number;
}

export interface MixBranch {
  kickDelayS: number;
  overheadDelayS: number;
  kickGain: number;
  /** Negative where the overhead is flipped. */
  overheadGain: number;
}

const amplitude = (db: number) => 10 ** (db / 20);

/**
 * Delays and gains of each choice. Both microphones are delayed by one common base, since nothing can be played before
 * it was read; that is what lets the overhead come earlier.
 *
 * @param safeDb - turns all choices down alike, so that the two added can't clip
 */
export function mixPlan(choices: readonly MixChoice[], safeDb: number): MixBranch[] {
  const baseMs = Math.max(0, ...choices.map((choice) => choice.shiftMs));
  return choices.map(({ flipped, shiftMs, gainDb, matchDb }) => ({
    kickDelayS: baseMs / 1000,
    overheadDelayS: (baseMs - shiftMs) / 1000,
    kickGain: amplitude(matchDb + safeDb),
    overheadGain: (flipped ? -1 : 1) * amplitude(gainDb + matchDb + safeDb),
  }));
}

/**
 * How far to turn the two down so that even their peaks on top of each other stay below full scale.
 *
 * @returns dB, 0 or below
 */
export function safeGainDb(peaksDbfs: { kick: number; overhead: number }, overheadGainDb: number): number {
  const worst = amplitude(peaksDbfs.kick) + amplitude(peaksDbfs.overhead + overheadGainDb);
  return Math.min(0, -20 * Math.log10(Math.max(worst, 1e-6)));
}

/**
 * Level of each choice on the matching band, as gains that only ever turn the louder ones down.
 *
 * @param levelsDb - of the choices, against any one reference
 */
export function matchGainsDb(levelsDb: readonly number[]): number[] {
  const lowest = Math.min(...levelsDb);
  return levelsDb.map((level) => lowest - level);
}
