import { decayKnee } from './knee';
import { fitLine } from './line';

/** How one band of one hit dies away; null what the range doesn't reach. */
export interface DecayFigures {
  /** From 0 to −10 dB, seconds per 60 dB. */
  readonly earlyS: number | null;
  /** From −5 to −25 dB, seconds per 60 dB. */
  readonly t20S: number | null;
  /** Energy of the first 50 ms over all that comes later. */
  readonly earlyToLateDb: number | null;
}

export const DECAY_HOP_MS = 1;

/** ISO 3382-1:2009 (as in pyrato and python-acoustics): 10 dB beyond the lower end of what is fitted. */
const T20_RANGE_DB = 35;
const EARLY_RANGE_DB = 20;
/** Early-to-late energy at 50 ms, C50 of ISO 3382-1. */
const EARLY_HOPS = 50 / DECAY_HOP_MS;

/**
 * Early decay, T20 and early-to-late energy of one band of one hit by backward integration.
 *
 * Integrated from the knee, where the decay sinks into the background; a steady background is taken off before (Chu 1978),
 * and what the decay would still have had after the knee is added (ISO 3382-1's correction).
 *
 * @param power - mean power of each 1 ms hop, beginning with the hit
 * @param backgroundDb - level just before the hit; the range is counted down to it at most
 * @see M. R. Schroeder, "New method of measuring reverberation time", JASA 37 (1965); ISO 3382-1:2009 (not seen)
 */
export function decayFigures(power: Float64Array, backgroundDb = -Infinity): DecayFigures {
  const knee = decayKnee(power);
  if (!knee) return { earlyS: null, t20S: null, earlyToLateDb: null };
  const left = remaining(power, knee);
  const levels = left.map((energy) => 10 * Math.log10(energy / left[0]));
  const loudestDb = 10 * Math.log10(power.reduce((most, value) => Math.max(most, value), 0));
  const rangeDb = Math.min(knee.rangeDb, loudestDb - backgroundDb);
  return {
    earlyS: rangeDb < EARLY_RANGE_DB ? null : secondsPer60Db(levels, { fromDb: 0, toDb: -10 }),
    t20S: rangeDb < T20_RANGE_DB ? null : secondsPer60Db(levels, { fromDb: -5, toDb: -25 }),
    earlyToLateDb:
      rangeDb < EARLY_RANGE_DB || left.length <= EARLY_HOPS
        ? null
        : 10 * Math.log10((left[0] - left[EARLY_HOPS]) / left[EARLY_HOPS]),
  };
}

/** Energy from each hop to the end of the decay; falls all the way. */
function remaining(
  power: Float64Array,
  { atHop, noisePower, restEnergy }: { atHop: number; noisePower: number; restEnergy: number },
): Float64Array {
  const left = new Float64Array(atHop);
  let energy = restEnergy;
  let least = 0;
  for (let i = atHop - 1; i >= 0; i -= 1) {
    energy += power[i] - noisePower;
    // Where the noise taken off is larger than what is there, the curve waits instead of turning round.
    least = Math.max(least, energy, restEnergy);
    left[i] = least;
  }
  return left;
}

function secondsPer60Db(
  levels: Float64Array,
  { fromDb, toDb }: { fromDb: number; toDb: number },
): number | null {
  const from = levels.findIndex((level) => level <= fromDb);
  const to = levels.findIndex((level) => level <= toDb);
  if (from < 0 || to < 0) return null;
  const line = fitLine(levels, from, to + 1);
  return line && line.slope < 0 ? ((-60 / line.slope) * DECAY_HOP_MS) / 1000 : null;
}
