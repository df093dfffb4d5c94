/**
 * White noise with a flat distribution, the same for the same seed: for specs.
 *
 * @param rms - linear
 */
export function seededNoise(options: { length: number; rms: number; seed: number }): Float32Array {
  let state = options.seed >>> 0;
  // A flat distribution of ±a has an RMS of a/√3.
  const largest = options.rms * Math.sqrt(3);
  return Float32Array.from({ length: options.length }, () => {
    // mulberry32 (Tommy Ettinger, public domain; from memory).
    state = (state + 0x6d2b79f5) >>> 0;
    let x = state;
    x = Math.imul(x ^ (x >>> 15), x | 1);
    x ^= x + Math.imul(x ^ (x >>> 7), x | 61);
    return (((x ^ (x >>> 14)) >>> 0) / 2 ** 31 - 1) * largest;
  });
}
