import { fitLine, type Line } from './line';

/** Where a decay ends, in hops; what stands there instead of it, and how it was falling. */
export interface Knee {
  /** Exclusive. */
  readonly atHop: number;
  /** Power per hop of a steady background; 0 where the decay was cut before it reached one. */
  readonly noisePower: number;
  /** Energy that a decay of this slope would still have had after the knee. */
  readonly restEnergy: number;
  /** From the loudest 10 ms down to where the decay ends. */
  readonly rangeDb: number;
}

/** Levels are smoothed over this many hops of 1 ms; common practice for such decays, no source. */
const BLOCK_HOPS = 10;
/** The background is first taken from the last tenth (Lundeby et al. 1995). */
const LAST_SHARE = 0.1;
/** The slope is fitted over this range above the background (Lundeby et al.: 5–10 dB over it, 10–20 dB wide). */
const OVER_NOISE_DB = 6;
const FIT_RANGE_DB = 25;
const ROUNDS = 4;
/** A tail counts as background when it lasts this long after the knee and its halves differ by so little; our choice. */
const STEADY_BLOCKS = 4;
const STEADY_DB = 2;
const LOWEST_POWER = 1e-30;

/**
 * Finds where a decay sinks into a steady background, or that it is cut before it does.
 *
 * @param power - mean power of each 1 ms hop, beginning with the hit
 * @returns null where nothing decays
 * @see A. Lundeby, T. E. Vigran, H. Bietz, M. Vorländer, "Uncertainties of measurements in room acoustics", Acustica 81
 *   (1995), whose iteration this follows (from memory)
 */
export function decayKnee(power: Float64Array): Knee | null {
  const levels = blockLevels(power);
  const top = levels.indexOf(levels.reduce((most, level) => Math.max(most, level), -Infinity));
  let noiseDb = meanLevel(power, Math.floor(power.length * (1 - LAST_SHARE)), power.length);
  let line: Line | null = null;
  let kneeBlock = levels.length;
  for (let round = 0; round < ROUNDS; round += 1) {
    line = slopeAbove(levels, top, noiseDb);
    if (!line || line.slope >= 0) return null;
    kneeBlock = Math.min(levels.length, (noiseDb - line.intercept) / line.slope);
    const after = Math.min(
      power.length * (1 - LAST_SHARE),
      (kneeBlock - OVER_NOISE_DB / line.slope) * BLOCK_HOPS,
    );
    noiseDb = meanLevel(power, Math.floor(after), power.length);
  }
  if (!line) return null;
  const steady = isSteady(levels, Math.ceil(kneeBlock), line);
  const atBlock = steady ? kneeBlock : levels.length;
  const endDb = line.intercept + line.slope * atBlock;
  const atHop = Math.min(power.length, Math.round((atBlock + 0.5) * BLOCK_HOPS));
  // ∫ of 10^(slope·t/10) from the knee on, t in hops.
  const perHop = ((-line.slope / BLOCK_HOPS) * Math.LN10) / 10;
  return {
    atHop,
    noisePower: steady ? Math.pow(10, noiseDb / 10) : 0,
    restEnergy: restEnergy({ line, atHop, perHop }),
    rangeDb: levels[top] - endDb,
  };
}

/** Block k's level stands for its middle, hop (k + ½) · 10. */
function restEnergy({ line, atHop, perHop }: { line: Line; atHop: number; perHop: number }): number {
  const levelDb = line.intercept + line.slope * (atHop / BLOCK_HOPS - 0.5);
  return Math.pow(10, levelDb / 10) / perHop;
}

function blockLevels(power: Float64Array): Float64Array {
  return Float64Array.from({ length: Math.floor(power.length / BLOCK_HOPS) }, (_unused, block) =>
    meanLevel(power, block * BLOCK_HOPS, (block + 1) * BLOCK_HOPS),
  );
}

function meanLevel(power: Float64Array, from: number, to: number): number {
  let sum = 0;
  for (let i = from; i < to; i += 1) sum += power[i];
  return 10 * Math.log10(Math.max(LOWEST_POWER, sum / Math.max(1, to - from)));
}

/** The line through the last 25 dB before the level comes near the background. */
function slopeAbove(levels: Float64Array, top: number, noiseDb: number): Line | null {
  let end = top;
  while (end < levels.length && levels[end] > noiseDb + OVER_NOISE_DB) end += 1;
  let from = end;
  while (from > top && levels[from - 1] < noiseDb + OVER_NOISE_DB + FIT_RANGE_DB) from -= 1;
  return fitLine(levels, Math.max(top, from), end);
}

function isSteady(levels: Float64Array, knee: number, line: Line): boolean {
  const from = Math.ceil(knee - OVER_NOISE_DB / line.slope);
  const count = levels.length - from;
  if (count < STEADY_BLOCKS) return false;
  const half = from + Math.floor(count / 2);
  const mean = (start: number, end: number): number => {
    let sum = 0;
    for (let i = start; i < end; i += 1) sum += Math.pow(10, levels[i] / 10);
    return 10 * Math.log10(sum / (end - start));
  };
  return Math.abs(mean(from, half) - mean(half, levels.length)) < STEADY_DB;
}
