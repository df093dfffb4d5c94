import { firstArrival } from '../arrival/firstArrival';
import { butterworthBand } from '../filters/butterworth';
import { filtered } from '../filters/filterChain';

/** The onset's band (docs/measurements.md, 3), so that a beater's click is seen and a drum that still rings is not. */
const BAND = { lowHz: 150, highHz: 4000 };
/** A rise that takes longer is another hit's; the greatest rise is seen up to 8 ms after the first sound. */
const BEFORE_MS = 10;
/** As far as the hit's own peak is looked for. */
const AFTER_MS = 10;
/** Lets the filter forget that the stretch begins in the middle of a sound, as for the onset. */
const SETTLE_MS = 20;

/**
 * Where a hit is first heard: the foot of the rise whose steepest place is its onset. Playing starts and pictures begin
 * here; arrival and adding up keep to the onset, which noise moves less.
 *
 * @param samples - the kick microphone around the hit
 * @returns index in `samples`, at most `onsetAt`
 */
export function foot(
  samples: Float32Array,
  { sampleRateHz, onsetAt }: { readonly sampleRateHz: number; readonly onsetAt: number },
): number {
  const count = (ms: number): number => Math.round((ms / 1000) * sampleRateHz);
  const start = Math.max(0, onsetAt - count(SETTLE_MS + BEFORE_MS));
  const around = samples.subarray(start, onsetAt + count(AFTER_MS));
  const first = firstArrival(filtered(around, butterworthBand({ sampleRateHz, ...BAND })), {
    sampleRateHz,
    from: Math.max(0, onsetAt - count(BEFORE_MS) - start),
    to: around.length,
  });
  return first ? Math.min(onsetAt, start + Math.floor(first.at)) : onsetAt;
}
