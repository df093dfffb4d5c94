import { randomNumbers } from '../../testing/randomNumbers';
import { createHitsAlike } from './hitsAlike';
import type { HitBins } from './pairSpectrum';

const BINS = 64;
/** A flat hit whose overhead is turned by `turn(bin)` radians. */
const hit = (turn: (bin: number) => number, { kick = 1, overhead = 1 } = {}): HitBins => {
  const over = (value: (bin: number) => number) => Float64Array.from({ length: BINS }, (_, i) => value(i));
  return {
    binHz: 48000 / 16384,
    skk: over(() => kick ** 2),
    soo: over(() => overhead ** 2),
    skoRe: over((i) => kick * overhead * Math.cos(turn(i))),
    skoIm: over((i) => kick * overhead * Math.sin(turn(i))),
    meanSquareOfBins: 1,
  };
};
const alike = (hits: readonly HitBins[]): number | null => {
  const meter = createHitsAlike();
  hits.forEach((each) => meter.add(each));
  return meter.result();
};

describe('how alike the hits of a pair are', () => {
  it('is 1 where each stands in the overhead as every other, however hard it was', () => {
    const strengths = [1, 0.1, 3, 0.5];
    const hits = strengths.map((kick) => hit((i) => 0.4 * i, { kick, overhead: -0.2 * kick }));
    expect(alike(hits)).toBeCloseTo(1, 9);
  });

  it('is 0 where two contradict each other', () => {
    expect(alike([hit(() => 0.3), hit(() => 0.3 + Math.PI)])).toBeCloseTo(0, 9);
  });

  it.each([4, 8, 16])('is about 0.89/√%d for hits at random times', (count) => {
    const random = randomNumbers(count);
    const drawn = Array.from({ length: 200 }, () =>
      alike(
        Array.from({ length: count }, () => {
          // Each bin on its own: nothing but chance.
          const turns = Array.from({ length: BINS }, () => Math.PI * random());
          return hit((i) => turns[i]);
        }),
      ),
    );
    const mean = drawn.reduce<number>((sum, value) => sum + (value ?? NaN), 0) / drawn.length;
    // √(π/4N), for four draws 1 % more than the limit for many.
    expect(Math.abs(mean - Math.sqrt(Math.PI / (4 * count)))).toBeLessThan(0.02);
  });

  it("doesn't look beyond the low end", () => {
    const low = (i: number): boolean => i * (48000 / 16384) < 160;
    const hits = [0, 1, 2, 3].map((turn) => hit((i) => (low(i) ? 0.5 : turn)));
    expect(alike(hits)).toBeCloseTo(1, 9);
  });

  it('is the same when the hits were gathered in two parts', () => {
    const hits = Array.from({ length: 6 }, (_, n) => hit((i) => 0.4 * i + n, { kick: n + 1 }));
    const [first, second, both] = [createHitsAlike(), createHitsAlike(), createHitsAlike()];
    hits.forEach((each, n) => (n < 3 ? first : second).add(each));
    both.include(first.sums());
    both.include(second.sums());
    expect(both.result()).toBeCloseTo(alike(hits) ?? NaN, 12);
  });

  it("can't be told without a hit that both hear, and leaves its input as it was", () => {
    expect(alike([])).toBeNull();
    expect(alike([hit(() => 0, { overhead: 0 })])).toBeNull();
    const bins = hit((i) => i);
    const before = structuredClone(bins);
    alike([bins]);
    expect(bins).toEqual(before);
  });
});
