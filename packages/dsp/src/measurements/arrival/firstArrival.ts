import type { Swing } from '../../facts';

export interface FirstArrival {
  /** Index into the samples, between two of them by linear interpolation. */
  readonly at: number;
  readonly swing: Swing;
  /** False where what sounded before hides the beginning, so that the time found may be late. */
  readonly clear: boolean;
}

export interface FirstArrivalOptions {
  readonly sampleRateHz: number;
  /** Stretch in which the arrival may lie. */
  readonly from: number;
  readonly to: number;
}

/** docs/measurements.md, 4; both tried on two real kits, see docs/decisions/0002-arrival.md. */
const SHARE_OF_PEAK = 0.1;
const OVER_BEFORE = 2;
/** What sounds before a hit may be this share of its peak; seen: up to 0.16 the time holds, from 0.28 it is late. */
const CLEAR_SHARE_OF_PEAK = 0.2;
/** "Just before": this long, ending a little earlier so that the rise itself isn't counted. */
const BEFORE_MS = 5;
const GAP_MS = 1;

/**
 * The first time a hit passes a tenth of its own peak and twice the level just before.
 *
 * @param samples - band-limited, both microphones alike
 * @returns null where nothing rises like that
 */
export function firstArrival(samples: Float64Array, options: FirstArrivalOptions): FirstArrival | null {
  const { sampleRateHz, from, to } = options;
  const peak = largest(samples, from, to);
  if (peak === 0) return null;
  const threshold = SHARE_OF_PEAK * peak;
  const before = Math.round((BEFORE_MS / 1000) * sampleRateHz);
  const gap = Math.max(1, Math.round((GAP_MS / 1000) * sampleRateHz));
  const levelBefore = (i: number): number => largest(samples, i - gap - before, i - gap);
  const clear = largest(samples, from - before, from) <= CLEAR_SHARE_OF_PEAK * peak;
  for (let i = Math.max(1, from); i < Math.min(to, samples.length); i += 1) {
    const size = Math.abs(samples[i]);
    if (size < threshold || size < OVER_BEFORE * levelBefore(i)) continue;
    return { at: crossing(samples, i, threshold), swing: samples[i] > 0 ? 'up' : 'down', clear };
  }
  return null;
}

function largest(samples: Float64Array, from: number, to: number): number {
  let peak = 0;
  for (let i = Math.max(0, from); i < Math.min(to, samples.length); i += 1)
    peak = Math.max(peak, Math.abs(samples[i]));
  return peak;
}

function crossing(samples: Float64Array, index: number, threshold: number): number {
  const below = Math.abs(samples[index - 1]);
  const above = Math.abs(samples[index]);
  return below < threshold && above > below ? index - (above - threshold) / (above - below) : index;
}
