import { HOP_MS } from '../hits/hopMeter';

/** Our choices; with them the true lag was the highest in every take tried, see docs/decisions/0002-arrival.md. */
const WINDOW_HOPS = 8 / HOP_MS;
const RISE_HOPS = 8 / HOP_MS;
/** What lies this far below the loudest hit is not told from silence, so that noise doesn't rise and fall. */
const FLOOR_BELOW_LOUDEST_DB = 30;

/**
 * How much the level rises, hop by hop: high where something is struck, 0 where it dies away. The mean is taken out.
 *
 * @param powers - mean square of each hop of 2 ms
 * @returns dB of rise within 8 ms, minus its mean; zeros for silence
 */
export function onsetEnvelope(powers: ArrayLike<number>): Float64Array {
  const smooth = movingSum(powers);
  let loudest = 0;
  for (let i = 0; i < smooth.length; i += 1) if (smooth[i] > loudest) loudest = smooth[i];
  const envelope = new Float64Array(smooth.length);
  if (loudest === 0) return envelope;
  const floor = loudest * 10 ** (-FLOOR_BELOW_LOUDEST_DB / 10);
  const levelsDb = smooth;
  for (let i = 0; i < smooth.length; i += 1) levelsDb[i] = 10 * Math.log10(smooth[i] + floor);
  let sum = 0;
  for (let i = RISE_HOPS; i < envelope.length; i += 1) {
    envelope[i] = Math.max(0, levelsDb[i] - levelsDb[i - RISE_HOPS]);
    sum += envelope[i];
  }
  const mean = sum / envelope.length;
  for (let i = 0; i < envelope.length; i += 1) envelope[i] -= mean;
  return envelope;
}

function movingSum(powers: ArrayLike<number>): Float64Array {
  const sums = new Float64Array(powers.length);
  for (let i = 0; i < sums.length; i += 1) {
    for (let back = 0; back < WINDOW_HOPS && back <= i; back += 1) sums[i] += powers[i - back];
  }
  return sums;
}
