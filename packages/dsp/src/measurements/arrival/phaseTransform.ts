import { createInverseReal } from '../spectrum/inverseReal';
import {
  createRealTransform,
  powerOfTwoFrom,
  type RealSpectrum,
  type RealTransform,
} from '../spectrum/realSpectrum';

/** One place where the two microphones' sound lines up. */
export interface PhasePeak {
  /** Positive: the second microphone is later. */
  readonly lagMs: number;
  /** 1 for a pure delay, negative where one is turned over, near 0 for unrelated sound. */
  readonly height: number;
}

export interface PhaseTransform {
  /** One hit: the same stretch of both microphones, at most {@link PHASE_STRETCH_MS} long, not yet tapered. */
  add(kick: Float32Array | Float64Array, overhead: Float32Array | Float64Array): void;
  /** What was added so far, to be carried to another one that goes on from here. */
  sums(): PhaseSums;
  /** Adds what another one gathered from hits that come later. */
  include(later: PhaseSums): void;
  /** @returns maxima of the weighted correlation between `fromMs` and `toMs`, highest first; none without hits */
  peaks(range: { readonly fromMs: number; readonly toMs: number }): PhasePeak[];
  /** @returns for each hit (the first 200) the lag nearest to `lagMs`, within 2 ms, where that hit alone lines up best */
  lagsPerHit(lagMs: number): number[];
}

/** What was gathered from some of the hits; can cross a thread. */
export interface PhaseSums {
  readonly hits: number;
  readonly sums: Sums;
  /** Of the first hits, each alone. */
  readonly single: readonly CrossSpectrum[];
}

/** Long enough for the beginning of a hit and an overhead some metres away; our choice. */
export const PHASE_STRETCH_MS = { before: 12, after: 30 };
/** Where a beater's click is; below, a bass drum is one long tone with no edge to place. Our choice. */
const LOW_HZ = 100;
const HIGH_HZ = 4000;
/** Fineness of the lag before the parabola: the spectrum is padded this many times. */
const FINER = 8;
/** So many hits are looked at one by one. */
export const HITS_KEPT = 200;
const NEAR_MS = 2;

/**
 * Generalised cross-correlation with phase transform, each bin weighted by how alike the two microphones are over the
 * hits (magnitude-squared coherence). One hit alone has coherence 1 everywhere: then it is the plain phase transform.
 *
 * @see C. H. Knapp and G. C. Carter, IEEE Trans. ASSP-24(4), 1976, Table I (as cited by phonometry and pyroomacoustics; not seen)
 */
export function createPhaseTransform(sampleRateHz: number, keptBefore = 0): PhaseTransform {
  const stretch = ((PHASE_STRETCH_MS.before + PHASE_STRETCH_MS.after) / 1000) * sampleRateHz;
  const size = powerOfTwoFrom(2 * stretch);
  // Each is made when it is needed: whoever adds hits needs the one, whoever looks for peaks the other.
  let transforms: { kick: RealTransform; overhead: RealTransform } | null = null;
  let inverse: ReturnType<typeof createInverseReal> | null = null;
  const bins = Math.min(size / 2, Math.ceil((HIGH_HZ * size) / sampleRateHz));
  const first = Math.ceil((LOW_HZ * size) / sampleRateHz);
  const sums = emptySums(bins);
  const single: CrossSpectrum[] = [];
  const tapered = createTaper();
  let hits = 0;
  const maxima = (cross: CrossSpectrum, fromMs: number, toMs: number): PhasePeak[] => {
    inverse ??= createInverseReal(size * FINER);
    const values = inverse(weighted(cross, sums, first));
    return peaksOf(values, { fromMs, toMs, stepMs: 1000 / (sampleRateHz * FINER) });
  };
  return {
    add(kick, overhead) {
      transforms ??= { kick: createRealTransform(size), overhead: createRealTransform(size) };
      const cross = addHit(sums, {
        kick: transforms.kick.spectrum(tapered(kick), bins),
        overhead: transforms.overhead.spectrum(tapered(overhead), bins),
      });
      hits += 1;
      if (keptBefore + single.length < HITS_KEPT) single.push(cross);
    },
    sums: () => ({ hits, sums, single }),
    include(later) {
      hits += later.hits;
      for (const name of ['re', 'im', 'kick', 'overhead'] as const) {
        for (let i = 0; i < bins; i += 1) sums[name][i] += later.sums[name][i];
      }
      single.push(...later.single.slice(0, HITS_KEPT - single.length));
    },
    peaks: ({ fromMs, toMs }) => (hits === 0 ? [] : maxima(sums, fromMs, toMs)),
    lagsPerHit: (lagMs) =>
      single.flatMap((cross) => maxima(cross, lagMs - NEAR_MS, lagMs + NEAR_MS).at(0)?.lagMs ?? []),
  };
}

interface CrossSpectrum {
  readonly re: Float32Array | Float64Array;
  readonly im: Float32Array | Float64Array;
}

interface Sums extends CrossSpectrum {
  readonly kick: Float64Array;
  readonly overhead: Float64Array;
}

function emptySums(bins: number): Sums {
  const [re, im, kick, overhead] = Array.from({ length: 4 }, () => new Float64Array(bins));
  return { re, im, kick, overhead };
}

/** Adds conj(kick) × overhead, so that a later overhead shows at a positive lag. @returns this hit's own */
function addHit(
  sums: Sums,
  { kick, overhead }: { readonly kick: RealSpectrum; readonly overhead: RealSpectrum },
): CrossSpectrum {
  const re = new Float32Array(sums.re.length);
  const im = new Float32Array(sums.re.length);
  for (let i = 0; i < re.length; i += 1) {
    re[i] = kick.re[i] * overhead.re[i] + kick.im[i] * overhead.im[i];
    im[i] = kick.re[i] * overhead.im[i] - kick.im[i] * overhead.re[i];
    sums.re[i] += re[i];
    sums.im[i] += im[i];
    sums.kick[i] += kick.re[i] ** 2 + kick.im[i] ** 2;
    sums.overhead[i] += overhead.re[i] ** 2 + overhead.im[i] ** 2;
  }
  return { re, im };
}

/** Phases alone, weighted by coherence; the weights add up to 1, so that a pure delay gives a height of 1. */
function weighted({ re, im }: CrossSpectrum, sums: Sums, first: number): RealSpectrum {
  const result = { re: new Float64Array(re.length), im: new Float64Array(re.length) };
  let weights = 0;
  for (let i = first; i < re.length; i += 1) {
    const both = sums.kick[i] * sums.overhead[i];
    const coherence = both > 0 ? (sums.re[i] ** 2 + sums.im[i] ** 2) / both : 0;
    const size = Math.hypot(re[i], im[i]);
    if (size === 0) continue;
    result.re[i] = (coherence * re[i]) / size;
    result.im[i] = (coherence * im[i]) / size;
    weights += coherence;
  }
  if (weights === 0) return result;
  for (let i = first; i < re.length; i += 1) {
    result.re[i] /= weights;
    result.im[i] /= weights;
  }
  return result;
}

/** A sine lobe: soft ends, and still much weight on the hit's beginning. What it gives is good until the next one. */
function createTaper(): (samples: Float32Array | Float64Array) => Float64Array {
  let lobe = new Float64Array(0);
  let room = new Float64Array(0);
  return (samples) => {
    if (lobe.length !== samples.length) {
      lobe = Float64Array.from(samples, (_unused, i) => Math.sin((Math.PI * (i + 0.5)) / samples.length));
      room = new Float64Array(samples.length);
    }
    for (let i = 0; i < room.length; i += 1) room[i] = samples[i] * lobe[i];
    return room;
  };
}

/** @param values - with the 1/N of the inverse transform, which the heights don't have */
function peaksOf(
  values: Float64Array,
  { fromMs, toMs, stepMs }: { fromMs: number; toMs: number; stepMs: number },
): PhasePeak[] {
  const at = (index: number): number => values[(index + values.length) % values.length];
  const found: PhasePeak[] = [];
  for (let i = Math.ceil(fromMs / stepMs); i <= Math.floor(toMs / stepMs); i += 1) {
    const [left, here, right] = [at(i - 1), at(i), at(i + 1)];
    if (Math.abs(here) <= Math.abs(left) || Math.abs(here) < Math.abs(right)) continue;
    // Parabola through three points (J. O. Smith, "Spectral Audio Signal Processing").
    const offset = (0.5 * (left - right)) / (left - 2 * here + right);
    const height = here - 0.25 * (left - right) * offset;
    found.push({ lagMs: (i + offset) * stepMs, height: (height * values.length) / 2 });
  }
  return found.sort((a, b) => Math.abs(b.height) - Math.abs(a.height));
}
