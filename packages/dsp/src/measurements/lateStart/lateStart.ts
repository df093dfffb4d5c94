import type { LateStartFacts } from '../../facts';
import { HOP_MS, hopSamples } from '../hits/hopMeter';
import type { LowHops } from '../hits/kickCandidates';
import { crossCorrelation } from './crossCorrelation';
import { onsetEnvelope } from './onsetEnvelope';

export interface LateStartMeter {
  push(hops: LowHops): void;
  /** @param kickHits - how many were found in the kick's file */
  result(kickHits: number): LateStartFacts | null;
}

/** So much of a take is looked at, whatever its length: memory stays at 1 MB and a transform at 2^17. */
const MOST_HOPS = 120_000;
/** measurements.md, 4: 0.02–1.5 s. Nearer than that it may be the way the sound goes; further, a bar could be taken for a start. */
const LEAST_MS = 20;
const MOST_MS = 1500;
/** Seen: 0.50 and more at the true lag of a take; two files of different takes stay below or have rivals. */
const LEAST_LIKENESS = 0.45;
/** A steady beat is like itself a beat later: the best lag must stand out from every other by this much. Our choice. */
const OVER_RIVALS = 1.15;
/** One hit lines up with any other, whatever they belong to; our choice. */
const LEAST_KICK_HITS = 3;
/** Lags this near belong to the same peak. */
const SAME_PEAK_MS = 20;

/**
 * Whether the overhead's file runs late or early against the kick's, and by how much: the lag at which what is struck
 * in the one lines up with what is struck in the other.
 *
 * Both are looked at below 150 Hz, where a kick sounds in both and cymbals in neither. Only what stands out is told: a
 * steady beat that fits as well a beat later gives null, and so do files that start together.
 */
export function createLateStart(sampleRateHz: number): LateStartMeter {
  const powers = { kick: new Float32Array(MOST_HOPS), overhead: new Float32Array(MOST_HOPS) };
  const hopMs = (1000 * hopSamples(sampleRateHz)) / sampleRateHz;
  let count = 0;
  return {
    push({ kick, overhead }) {
      const room = Math.min(kick.length, MOST_HOPS - count);
      powers.kick.set(kick.subarray(0, room), count);
      powers.overhead.set(overhead.subarray(0, room), count);
      count += room;
    },
    result(kickHits) {
      if (kickHits < LEAST_KICK_HITS) return null;
      const [kick, overhead] = [powers.kick, powers.overhead].map((each) => each.subarray(0, count));
      return lateStart({ kick, overhead }, hopMs);
    },
  };
}

function lateStart(
  powers: { readonly kick: Float32Array; readonly overhead: Float32Array },
  hopMs: number,
): LateStartFacts | null {
  const mostLag = Math.round(MOST_MS / HOP_MS);
  const likeness = crossCorrelation(onsetEnvelope(powers.kick), onsetEnvelope(powers.overhead), mostLag);
  const best = likeness.reduce((most, value, i) => (value > likeness[most] ? i : most), 0);
  if (best === 0 || best === likeness.length - 1 || likeness[best] < LEAST_LIKENESS) return null;
  const near = Math.round(SAME_PEAK_MS / hopMs);
  const rival = likeness.reduce(
    (most, value, i) => (Math.abs(i - best) > near ? Math.max(most, value) : most),
    0,
  );
  if (likeness[best] < OVER_RIVALS * rival) return null;
  const overheadLateMs = (best - mostLag + summit(likeness, best)) * hopMs;
  return Math.abs(overheadLateMs) < LEAST_MS ? null : { overheadLateMs, likeness: likeness[best] };
}

/** Between two hops, by a parabola through three (J. O. Smith, "Spectral Audio Signal Processing"). */
function summit(values: Float64Array, at: number): number {
  const [left, here, right] = [values[at - 1], values[at], values[at + 1]];
  const bend = left - 2 * here + right;
  return bend === 0 ? 0 : (0.5 * (left - right)) / bend;
}
