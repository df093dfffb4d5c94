import { assertPositive } from '../../assert';
import { dbAmplitude } from '../../decibel';
import type { Choice, PairSpectrum } from '../../facts';

/** Half-open range of frequencies. */
export interface Band {
  readonly lowHz: number;
  readonly highHz: number;
}

export interface BandEnergies {
  /** Of the two added: Σ (Skk + g²·Soo + 2·s·g·Re(Sko·e^(−j2πfτ))). */
  readonly added: number;
  /** Σ (Skk + g²·Soo): what two sounds that know nothing of each other would make. */
  readonly powerSum: number;
}

/** The low end: what the verdict counts (docs/measurements.md, 5). */
export const lowEnd: Band = { lowHz: 30, highHz: 150 };

/**
 * A sum of squares can't be negative; float32 rounding makes it so where the two cancel wholly. The floor keeps levels
 * finite: −100 dB against the power sum is far below what any real pair reaches.
 */
const DEEPEST_SHARE = 1e-10;

/**
 * Energy of the two microphones added, over a band.
 *
 * A bin counts by the part of it that lies in the band, so narrow bands don't jump with the bin width.
 *
 * @param spectrum - may be of any size; bins it doesn't have count as silent
 */
export function bandEnergies(spectrum: PairSpectrum, choice: Choice, band: Band): BandEnergies {
  assertPositive(spectrum.binHz, 'binHz');
  const gain = dbAmplitude(choice.gainDb);
  const cross = 2 * gain * (choice.flipped ? -1 : 1);
  const radiansPerBin = (-2 * Math.PI * spectrum.binHz * choice.shiftMs) / 1000;
  let added = 0;
  let powerSum = 0;
  forBins(spectrum, band, (i, weight) => {
    const power = spectrum.skk[i] + gain * gain * spectrum.soo[i];
    const turn = radiansPerBin * i;
    const real = spectrum.skoRe[i] * Math.cos(turn) - spectrum.skoIm[i] * Math.sin(turn);
    powerSum += weight * power;
    added += weight * (power + cross * real);
  });
  return { added: Math.max(added, powerSum * DEEPEST_SHARE), powerSum };
}

/** Calls `visit` for each bin that lies at least partly in the band, with the part of it (0–1) that does. */
export function forBins(
  spectrum: Pick<PairSpectrum, 'binHz'> & { readonly skk: ArrayLike<number> },
  { lowHz, highHz }: Band,
  visit: (bin: number, weight: number) => void,
): void {
  const low = lowHz / spectrum.binHz;
  const high = highHz / spectrum.binHz;
  const last = Math.min(spectrum.skk.length - 1, Math.ceil(high + 0.5));
  for (let i = Math.max(0, Math.floor(low - 0.5)); i <= last; i += 1) {
    const weight = Math.min(i + 0.5, high) - Math.max(i - 0.5, low);
    if (weight > 0) visit(i, weight);
  }
}

/** @returns 10·lg(part ÷ whole); null where there is nothing to compare */
export function ratioDb(part: number, whole: number): number | null {
  return part > 0 && whole > 0 ? 10 * Math.log10(part / whole) : null;
}
