/**
 * Uniform numbers from 0 (inclusive) to 1 (exclusive), one a call, the same for the same seed: mulberry32 (public domain;
 * from memory). Good enough to draw samples with, not for secrets.
 *
 * @param seed - any integer
 */
export function seededRandom(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61)) ^ mixed;
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4294967296;
  };
}
