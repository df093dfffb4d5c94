import type { PairSpectrum } from '../../facts';
import { createRealTransform, powerOfTwoFrom } from '../spectrum/realSpectrum';

/** One kick hit in both microphones, and how far its sound may be followed. */
export interface PairHit {
  readonly kick: Float32Array;
  readonly overhead: Float32Array;
  /** Index of the hit's onset in both. */
  readonly onsetAt: number;
  /** Samples from this onset to the next kick hit's; Infinity for the last. */
  readonly toNext: number;
}

/** What one hit alone says. */
export interface HitBalance {
  /** Σ Re Sko over 30–150 Hz: positive where the two add as recorded. */
  readonly lowCross: number;
  /** The same with a low cut on the overhead. */
  readonly lowCrossLowCut: number;
}

export interface PairGatherer {
  add(hit: PairHit): HitBalance;
  /** @returns null where no hit was added */
  result(): PairSpectrum | null;
}

/** Window of a kick hit (section 5); the pair trace reads the same. */
export const kickWindow = { beforeMs: 10, afterMs: 200 } as const;

/** Bins are kept up to here (section "Architecture": about 70 kB a pair). */
const HIGHEST_KEPT_HZ = 12000;
/** 16,384 points at 44.1 and 48 kHz give 2.69 and 2.93 Hz; other rates get the power of two next below 3 Hz. */
const WIDEST_BIN_HZ = 3;
/** Raised-cosine ends, our choice: in before the onset, out over the last quarter, where the drum has decayed. */
const FADE_IN_MS = 5;
const FADE_OUT_SHARE = 0.25;

/** @returns the length of the transform for a sample rate: bins of at most 3 Hz */
export function pairTransformSize(sampleRateHz: number): number {
  return powerOfTwoFrom(sampleRateHz / WIDEST_BIN_HZ);
}

export interface PairGathererOptions {
  readonly sampleRateHz: number;
  /** Weights a hit's cross spectrum into {@link HitBalance}. */
  readonly lowCross: (skoRe: Float64Array, skoIm: Float64Array, binHz: number) => HitBalance;
}

/**
 * Adds up the kick hits of a pair: Skk, Soo and Sko = kick × conj(overhead).
 *
 * Each hit counts by its energy, so loud hits weigh most. Both microphones get the same window, so a delay between them
 * stays in the phase of Sko.
 */
export function createPairGatherer({ sampleRateHz, lowCross }: PairGathererOptions): PairGatherer {
  const size = pairTransformSize(sampleRateHz);
  const transforms = { kick: createRealTransform(size), overhead: createRealTransform(size) };
  const binHz = sampleRateHz / size;
  const binCount = Math.min(size / 2 + 1, Math.floor(HIGHEST_KEPT_HZ / binHz) + 1);
  const [skk, soo, skoRe, skoIm] = Array.from({ length: 4 }, () => new Float64Array(binCount));
  const [re, im] = [new Float64Array(binCount), new Float64Array(binCount)];
  let hitCount = 0;
  return {
    add(hit) {
      const k = transforms.kick.spectrum(windowed(hit.kick, hit, sampleRateHz));
      const o = transforms.overhead.spectrum(windowed(hit.overhead, hit, sampleRateHz));
      for (let i = 0; i < binCount; i += 1) {
        re[i] = k.re[i] * o.re[i] + k.im[i] * o.im[i];
        im[i] = k.im[i] * o.re[i] - k.re[i] * o.im[i];
        skk[i] += k.re[i] ** 2 + k.im[i] ** 2;
        soo[i] += o.re[i] ** 2 + o.im[i] ** 2;
        skoRe[i] += re[i];
        skoIm[i] += im[i];
      }
      hitCount += 1;
      return lowCross(re, im, binHz);
    },
    result: () =>
      hitCount === 0
        ? null
        : {
            binHz,
            hitCount,
            skk: Float32Array.from(skk),
            soo: Float32Array.from(soo),
            skoRe: Float32Array.from(skoRe),
            skoIm: Float32Array.from(skoIm),
          },
  };
}

function windowed(samples: Float32Array, { onsetAt, toNext }: PairHit, sampleRateHz: number): Float64Array {
  const count = (ms: number): number => Math.round((ms / 1000) * sampleRateHz);
  const start = Math.max(0, onsetAt - count(kickWindow.beforeMs));
  const end = Math.min(samples.length, onsetAt + Math.min(count(kickWindow.afterMs), toNext));
  const fadeIn = count(FADE_IN_MS);
  const fadeOut = (end - start) * FADE_OUT_SHARE;
  const output = Float64Array.from(samples.subarray(start, Math.max(start, end)));
  for (let i = 0; i < output.length; i += 1) {
    const nearest = Math.min((i + 0.5) / fadeIn, (output.length - i - 0.5) / fadeOut);
    if (nearest < 1) output[i] *= 0.5 * (1 - Math.cos(Math.PI * nearest));
  }
  return output;
}
