/** Powers at or below this are told as this: far below any converter's noise, and a number rather than −∞. */
export const SILENCE_DB = -200;
const LOUDEST_DB = 50;
const BIN_DB = 0.5;

/** @returns 10·log10 of a power, never below {@link SILENCE_DB} */
export function flooredPowerDb(power: number): number {
  return power > 0 ? Math.max(SILENCE_DB, 10 * Math.log10(power)) : SILENCE_DB;
}

/** Counts levels in half-decibel steps, so that a percentile of a long take needs no list of its levels. */
export interface LevelHistogram {
  add(levelDb: number): void;
  /** @returns the level below which `share` (0–1) of those added lie, to half a decibel; {@link SILENCE_DB} when empty */
  percentileDb(share: number): number;
}

/** Bounded memory whatever the length of the take. */
export function createLevelHistogram(): LevelHistogram {
  const counts = new Uint32Array((LOUDEST_DB - SILENCE_DB) / BIN_DB + 1);
  let total = 0;
  return {
    add(levelDb) {
      const bin = Math.round((levelDb - SILENCE_DB) / BIN_DB);
      counts[Math.min(counts.length - 1, Math.max(0, bin))] += 1;
      total += 1;
    },
    percentileDb(share) {
      let below = 0;
      for (let bin = 0; bin < counts.length; bin += 1) {
        below += counts[bin];
        if (total > 0 && below >= share * total) return SILENCE_DB + bin * BIN_DB;
      }
      return SILENCE_DB;
    },
  };
}
