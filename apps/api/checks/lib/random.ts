import { Random } from '@thudline/fixtures';

export const between = (random: Random, low: number, high: number) => low + random.uniform() * (high - low);

export function shuffled<T>(random: Random, items: readonly T[]): T[] {
  const rest = [...items];
  for (let last = rest.length - 1; last > 0; last--) {
    const other = Math.floor(random.uniform() * (last + 1));
    [rest[last], rest[other]] = [rest[other] as T, rest[last] as T];
  }
  return rest;
}
