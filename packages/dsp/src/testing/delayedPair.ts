import type { PairSpectrum } from '../facts';

/** A pair spectrum written down from its formula: white sound, and the same `delayMs` later and `gain` times as large. */
export function delayedPair({
  delayMs = 0,
  gain = 1,
}: { delayMs?: number; gain?: number } = {}): PairSpectrum {
  const binHz = 48000 / 16384;
  const bins = Array.from({ length: 4097 }, (_, i) => i);
  // Sko = K·conj(g·K·e^(−jωD)) = g·|K|²·e^(jωD).
  const turn = (i: number): number => (2 * Math.PI * i * binHz * delayMs) / 1000;
  return {
    binHz,
    hitCount: 1,
    skk: Float32Array.from(bins, () => 1),
    soo: Float32Array.from(bins, () => gain * gain),
    skoRe: Float32Array.from(bins, (i) => gain * Math.cos(turn(i))),
    skoIm: Float32Array.from(bins, (i) => gain * Math.sin(turn(i))),
  };
}
