import type { PairSpectrum } from '../../facts';
import {
  createRealTransform,
  powerOfTwoFrom,
  type RealSpectrum,
  type RealTransform,
} from '../spectrum/realSpectrum';

/** One kick hit in both microphones, and how far its sound may be followed. */
export interface PairHit {
  readonly kick: Float32Array;
  readonly overhead: Float32Array;
  /** Index of the hit's onset in both. */
  readonly onsetAt: number;
  /** Samples from this onset to the next kick hit's; Infinity for the last. */
  readonly toNext: number;
}

/** One hit's spectra, bin by bin; only valid until the next hit. */
export interface HitBins {
  readonly binHz: number;
  readonly skk: Float64Array;
  readonly soo: Float64Array;
  readonly skoRe: Float64Array;
  readonly skoIm: Float64Array;
  /** A band's Σ Soo times this is its mean square over a whole window; a shorter hit counts as silent after its end. */
  readonly meanSquareOfBins: number;
}

export interface PairGatherer<Told> {
  /** @returns what this hit alone says */
  add(hit: PairHit): Told;
  /** What was added so far, to be carried to another one that goes on from here. */
  sums(): PairSums;
  /** Adds what another one gathered. */
  include(other: PairSums): void;
  /** @returns null where no hit was added */
  result(): PairSpectrum | null;
}

/** What was gathered from some of the hits; can cross a thread. */
export interface PairSums {
  readonly hitCount: number;
  readonly skk: Float64Array;
  readonly soo: Float64Array;
  readonly skoRe: Float64Array;
  readonly skoIm: Float64Array;
}

/** Window of a kick hit (docs/measurements.md, 5); the pair trace reads the same. */
export const kickWindow = { beforeMs: 10, afterMs: 200 } as const;

/** Bins are kept up to here (about 70 kB a pair). */
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

export interface PairGathererOptions<Told> {
  readonly sampleRateHz: number;
  /** What is told of each hit alone. */
  readonly perHit: (bins: HitBins) => Told;
}

/**
 * Adds up the kick hits of a pair: Skk, Soo and Sko = kick × conj(overhead).
 *
 * Each hit counts by its energy, so loud hits weigh most. Both microphones get the same window, so a delay between them
 * stays in the phase of Sko.
 */
export function createPairGatherer<Told>(options: PairGathererOptions<Told>): PairGatherer<Told> {
  const { sampleRateHz, perHit } = options;
  const size = pairTransformSize(sampleRateHz);
  // Made for the first hit: whoever only includes sums needs none.
  let transforms: { kick: RealTransform; overhead: RealTransform } | null = null;
  const binHz = sampleRateHz / size;
  const binCount = Math.min(size / 2 + 1, Math.floor(HIGHEST_KEPT_HZ / binHz) + 1);
  const [skk, soo, skoRe, skoIm] = Array.from({ length: 4 }, () => new Float64Array(binCount));
  const hitBins: HitBins = {
    binHz,
    skk: new Float64Array(binCount),
    soo: new Float64Array(binCount),
    skoRe: new Float64Array(binCount),
    skoIm: new Float64Array(binCount),
    meanSquareOfBins: 2 / size / windowEnergy(sampleRateHz),
  };
  const windowed = createHitWindow(sampleRateHz);
  let hitCount = 0;
  return {
    add(hit) {
      transforms ??= { kick: createRealTransform(size), overhead: createRealTransform(size) };
      const k = transforms.kick.spectrum(windowed(hit.kick, hit), binCount);
      const o = transforms.overhead.spectrum(windowed(hit.overhead, hit), binCount);
      multiply(k, o, hitBins);
      addTo(skk, hitBins.skk);
      addTo(soo, hitBins.soo);
      addTo(skoRe, hitBins.skoRe);
      addTo(skoIm, hitBins.skoIm);
      hitCount += 1;
      return perHit(hitBins);
    },
    sums: () => ({ hitCount, skk, soo, skoRe, skoIm }),
    include(other) {
      hitCount += other.hitCount;
      addTo(skk, other.skk);
      addTo(soo, other.soo);
      addTo(skoRe, other.skoRe);
      addTo(skoIm, other.skoIm);
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

/** Energy of both and kick × conj(overhead), as far as there is room. */
function multiply(
  { re: kickRe, im: kickIm }: RealSpectrum,
  { re: overheadRe, im: overheadIm }: RealSpectrum,
  { skk, soo, skoRe, skoIm }: HitBins,
): void {
  for (let i = 0; i < skk.length; i += 1) {
    const [a, b, c, d] = [kickRe[i], kickIm[i], overheadRe[i], overheadIm[i]];
    skk[i] = a * a + b * b;
    soo[i] = c * c + d * d;
    skoRe[i] = a * c + b * d;
    skoIm[i] = b * c - a * d;
  }
}

function addTo(sums: Float64Array, values: Float64Array): void {
  for (let i = 0; i < sums.length; i += 1) sums[i] += values[i];
}

/** Σ w² of a whole window: the mean square of a raised-cosine end is 3/8. */
function windowEnergy(sampleRateHz: number): number {
  const lengthMs = kickWindow.beforeMs + kickWindow.afterMs;
  const endsMs = FADE_IN_MS + FADE_OUT_SHARE * lengthMs;
  return (sampleRateHz * (lengthMs - (5 / 8) * endsMs)) / 1000;
}

/** Cuts a hit out under its window; what it gives is good until the next one. */
function createHitWindow(sampleRateHz: number): (samples: Float32Array, hit: PairHit) => Float64Array {
  const count = (ms: number): number => Math.round((ms / 1000) * sampleRateHz);
  const longest = count(kickWindow.beforeMs) + count(kickWindow.afterMs);
  const room = new Float64Array(longest);
  const fadeIn = count(FADE_IN_MS);
  // Both microphones have the same window, and so have most hits.
  const weights = { length: -1, values: new Float64Array(longest) };
  const weightsFor = (length: number): Float64Array => {
    if (weights.length === length) return weights.values;
    weights.length = length;
    const fadeOut = length * FADE_OUT_SHARE;
    const { values } = weights;
    for (let i = 0; i < length; i += 1) {
      const nearest = Math.min((i + 0.5) / fadeIn, (length - i - 0.5) / fadeOut);
      values[i] = nearest < 1 ? 0.5 * (1 - Math.cos(Math.PI * nearest)) : 1;
    }
    return values;
  };
  return (samples, { onsetAt, toNext }) => {
    const start = Math.max(0, onsetAt - count(kickWindow.beforeMs));
    const end = Math.min(samples.length, onsetAt + Math.min(count(kickWindow.afterMs), toNext));
    const length = Math.max(0, end - start);
    const values = weightsFor(length);
    for (let i = 0; i < length; i += 1) room[i] = samples[start + i] * values[i];
    return room.subarray(0, length);
  };
}
