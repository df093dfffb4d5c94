import { forBins, lowEnd } from './choiceEnergy';
import type { HitBins } from './pairSpectrum';

export interface HitsAlikeMeter {
  /** One hit; its bins aren't kept. */
  add(bins: HitBins): void;
  /** What was added so far, to be carried to another one that goes on from here; can cross a thread. */
  sums(): AlikeSums;
  /** Adds what another one gathered. */
  include(other: AlikeSums): void;
  /** @returns 0–1; null before a hit that both microphones hear */
  result(): number | null;
}

/** The low end, bin by bin. */
export type AlikeSums = readonly (BinSums & { readonly bin: number })[];

/** One bin of the low end, added up over the hits. */
interface BinSums {
  re: number;
  im: number;
  kick: number;
  overhead: number;
}

/**
 * How far all hits of a pair tell of the same way between the two microphones: the magnitude of coherence over the hits,
 * 30–150 Hz, Σ|ΣSko| ÷ Σ√(ΣSkk·ΣSoo) (inner sums over hits, outer ones over bins).
 *
 * Every hit counts the same, whatever its strength. 1 where each stands in the overhead as every other does; about 0.89/√N
 * where the phases of N hits are drawn at random, as in an overhead of another pass: the mean length of a random walk,
 * √(π/4N).
 */
export function createHitsAlike(): HitsAlikeMeter {
  const sums = new Map<number, BinSums>();
  const addTo = (bin: number, added: BinSums): void => {
    const sum = sums.get(bin) ?? { re: 0, im: 0, kick: 0, overhead: 0 };
    sum.re += added.re;
    sum.im += added.im;
    sum.kick += added.kick;
    sum.overhead += added.overhead;
    sums.set(bin, sum);
  };
  return {
    add(bins) {
      const kick = energyOf(bins, bins.skk);
      const overhead = energyOf(bins, bins.soo);
      if (kick === 0 || overhead === 0) return;
      const both = Math.sqrt(kick * overhead);
      forBins(bins, lowEnd, (i, weight) => {
        addTo(i, {
          re: (weight * bins.skoRe[i]) / both,
          im: (weight * bins.skoIm[i]) / both,
          kick: (weight * bins.skk[i]) / kick,
          overhead: (weight * bins.soo[i]) / overhead,
        });
      });
    },
    sums: () => [...sums].map(([bin, sum]) => ({ bin, ...sum })),
    include(other) {
      for (const sum of other) addTo(sum.bin, sum);
    },
    result() {
      let [alike, most] = [0, 0];
      for (const { re, im, kick, overhead } of sums.values()) {
        alike += Math.hypot(re, im);
        most += Math.sqrt(kick * overhead);
      }
      return most > 0 ? Math.min(1, alike / most) : null;
    },
  };
}

function energyOf(bins: HitBins, power: Float64Array): number {
  let energy = 0;
  forBins(bins, lowEnd, (i, weight) => {
    energy += weight * power[i];
  });
  return energy;
}
