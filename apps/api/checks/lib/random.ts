export type Random = () => number;

/** Numbers from 0 to below 1, the same for the same seed (mulberry32, public domain). */
export function createRandom(seed: number): Random {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state);
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed;
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
}

export const between = (random: Random, low: number, high: number) => low + random() * (high - low);

export function shuffled<T>(random: Random, items: readonly T[]): T[] {
  const rest = [...items];
  for (let last = rest.length - 1; last > 0; last--) {
    const other = Math.floor(random() * (last + 1));
    [rest[last], rest[other]] = [rest[other] as T, rest[last] as T];
  }
  return rest;
}
