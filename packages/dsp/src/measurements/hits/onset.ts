import { butterworthBand } from '../filters/butterworth';
import { filtered } from '../filters/filterChain';

/** The band of a beater's click, and the span whose rise is looked for (docs/measurements.md, 3). */
const LOW_HZ = 150;
const HIGH_HZ = 4000;
const RISE_MS = 2;
const BEFORE_MS = 30;
const AFTER_MS = 20;
/** Lets the filter forget that the stretch begins in the middle of a sound: three periods of 150 Hz. */
const SETTLE_MS = 20;

/** Stretch to read around a candidate, ms before and after it. */
export const onsetStretch = { beforeMs: BEFORE_MS + SETTLE_MS + RISE_MS, afterMs: AFTER_MS + RISE_MS };

/** Memory that is used again from hit to hit; what was in it doesn't matter. */
export interface OnsetRoom {
  /** At least as many numbers as samples, and one more in the second. */
  readonly band: Float64Array;
  readonly energyBefore: Float64Array;
}

/**
 * Where a hit begins: the place with the greatest rise of energy from one 2 ms span to the next, 150–4000 Hz, from 30 ms
 * before the candidate to 20 ms after.
 *
 * @param samples - the kick microphone around the candidate, as {@link onsetStretch} says
 * @param candidateAt - index of the candidate in `samples`
 * @returns index in `samples`
 */
export function onset(
  samples: Float32Array,
  {
    sampleRateHz,
    candidateAt,
    room,
  }: { readonly sampleRateHz: number; readonly candidateAt: number; readonly room?: OnsetRoom },
): number {
  const sections = butterworthBand({ sampleRateHz, lowHz: LOW_HZ, highHz: HIGH_HZ });
  const band = filtered(samples, sections, room?.band);
  const energyBefore = room?.energyBefore ?? new Float64Array(band.length + 1);
  energyBefore[0] = 0;
  for (let i = 0; i < band.length; i += 1) energyBefore[i + 1] = energyBefore[i] + band[i] * band[i];
  const span = Math.max(1, Math.round((RISE_MS / 1000) * sampleRateHz));
  const first = Math.max(span, candidateAt - Math.round((BEFORE_MS / 1000) * sampleRateHz));
  const last = Math.min(band.length - span, candidateAt + Math.round((AFTER_MS / 1000) * sampleRateHz));
  let best = candidateAt;
  let greatest = 0;
  for (let i = first; i <= last; i += 1) {
    const rise = energyBefore[i + span] - 2 * energyBefore[i] + energyBefore[i - span];
    if (rise > greatest) {
      greatest = rise;
      best = i;
    }
  }
  return best;
}
