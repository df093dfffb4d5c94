import { createInverseReal } from '../spectrum/inverseReal';
import { createRealTransform, powerOfTwoFrom } from '../spectrum/realSpectrum';

/** One place where the two microphones' sound lines up. */
export interface PhasePeak {
  /** Positive: the second microphone is later. */
  readonly lagMs: number;
  /** 1 for a pure delay, negative where one is turned over, near 0 for unrelated sound. */
  readonly height: number;
}

export interface PhaseTransform {
  /** One hit: the same stretch of both microphones, at most {@link PHASE_STRETCH_MS} long, not yet tapered. */
  add(kick: Float64Array, overhead: Float64Array): void;
  /** @returns maxima of the weighted correlation between `fromMs` and `toMs`, highest first; none without hits */
  peaks(range: { readonly fromMs: number; readonly toMs: number }): PhasePeak[];
  /** @returns for each hit (the first 200) the lag nearest to `lagMs`, within 2 ms, where that hit alone lines up best */
  lagsPerHit(lagMs: number): number[];
}

/** Long enough for the beginning of a hit and an overhead some metres away; our choice. */
export const PHASE_STRETCH_MS = { before: 12, after: 30 };
/** Where a beater's click is; below, a bass drum is one long tone with no edge to place. Our choice. */
const LOW_HZ = 100;
const HIGH_HZ = 4000;
/** Fineness of the lag before the parabola: the spectrum is padded this many times. */
const FINER = 8;
const HITS_KEPT = 200;
const NEAR_MS = 2;

/**
 * Generalised cross-correlation with phase transform, each bin weighted by how alike the two microphones are over the
 * hits (magnitude-squared coherence). One hit alone has coherence 1 everywhere: then it is the plain phase transform.
 *
 * @see C. H. Knapp and G. C. Carter, IEEE Trans. ASSP-24(4), 1976, Table I (as cited in ../check-values.md, section 8)
 */
export function createPhaseTransform(sampleRateHz: number): PhaseTransform {
  const stretch = ((PHASE_STRETCH_MS.before + PHASE_STRETCH_MS.after) / 1000) * sampleRateHz;
  const transform = createRealTransform(powerOfTwoFrom(2 * stretch));
  const fineSize = transform.size * FINER;
  const inverse = createInverseReal(fineSize);
  const binHz = sampleRateHz / transform.size;
  const bins = Math.min(transform.size / 2, Math.ceil(HIGH_HZ / binHz));
  const first = Math.ceil(LOW_HZ / binHz);
  const sums = { kick: new Float64Array(bins), overhead: new Float64Array(bins) };
  const total = { re: new Float64Array(bins), im: new Float64Array(bins) };
  const single: { re: Float32Array; im: Float32Array }[] = [];
  let hits = 0;
  const correlation = (re: ArrayLike<number>, im: ArrayLike<number>): Float64Array => {
    const weighted = { re: new Float64Array(bins), im: new Float64Array(bins) };
    let weights = 0;
    for (let i = first; i < bins; i += 1) {
      const both = sums.kick[i] * sums.overhead[i];
      const coherence = both > 0 ? (total.re[i] ** 2 + total.im[i] ** 2) / both : 0;
      const size = Math.hypot(re[i], im[i]);
      if (size === 0) continue;
      weighted.re[i] = (coherence * re[i]) / size;
      weighted.im[i] = (coherence * im[i]) / size;
      weights += coherence;
    }
    const correlated = inverse(weighted);
    const scale = weights > 0 ? fineSize / (2 * weights) : 0;
    for (let i = 0; i < correlated.length; i += 1) correlated[i] *= scale;
    return correlated;
  };
  const maxima = (values: Float64Array, fromMs: number, toMs: number): PhasePeak[] =>
    peaksOf(values, { fromMs, toMs, stepMs: 1000 / (sampleRateHz * FINER) });
  return {
    add(kick, overhead) {
      const k = transform.spectrum(tapered(kick));
      const o = transform.spectrum(tapered(overhead));
      const re = new Float32Array(bins);
      const im = new Float32Array(bins);
      for (let i = 0; i < bins; i += 1) {
        // conj(kick) × overhead: a later overhead shows at a positive lag.
        re[i] = k.re[i] * o.re[i] + k.im[i] * o.im[i];
        im[i] = k.re[i] * o.im[i] - k.im[i] * o.re[i];
        total.re[i] += re[i];
        total.im[i] += im[i];
        sums.kick[i] += k.re[i] ** 2 + k.im[i] ** 2;
        sums.overhead[i] += o.re[i] ** 2 + o.im[i] ** 2;
      }
      hits += 1;
      if (single.length < HITS_KEPT) single.push({ re, im });
    },
    peaks: ({ fromMs, toMs }) => (hits === 0 ? [] : maxima(correlation(total.re, total.im), fromMs, toMs)),
    lagsPerHit: (lagMs) =>
      single.flatMap(({ re, im }) => {
        const best = maxima(correlation(re, im), lagMs - NEAR_MS, lagMs + NEAR_MS).at(0);
        return best ? [best.lagMs] : [];
      }),
  };
}

function tapered(samples: Float64Array): Float64Array {
  // A sine lobe: soft ends, and still much weight on the hit's beginning.
  return samples.map((sample, i) => sample * Math.sin((Math.PI * (i + 0.5)) / samples.length));
}

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
    found.push({ lagMs: (i + offset) * stepMs, height: here - 0.25 * (left - right) * offset });
  }
  return found.sort((a, b) => Math.abs(b.height) - Math.abs(a.height));
}
