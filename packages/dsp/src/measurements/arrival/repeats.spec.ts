import { randomNumbers } from '../../testing/randomNumbers';
import { repeats } from './repeats';

const noise = (seed: number, length = 240): Float64Array => {
  const random = randomNumbers(seed);
  return Float64Array.from({ length }, random);
};
const drum = (gain: number): Float64Array =>
  Float64Array.from({ length: 240 }, (_, i) => gain * Math.exp(-i / 80) * Math.sin(i / 12));

describe('what repeats from hit to hit', () => {
  it('is a drum, however hard it is struck', () => {
    expect(repeats([drum(1), drum(0.2), drum(3)])).toBeCloseTo(1, 9);
    expect(repeats([drum(1), drum(-1)])).toBeCloseTo(-1, 9);
  });

  it('is no noise, which is new each time', () => {
    // Of 240 independent samples a coefficient strays by 1/√240 = 0.065; the median of 28 pairs less.
    const told = repeats(Array.from({ length: 8 }, (_, i) => noise(i + 1)));
    expect(Math.abs(told ?? NaN)).toBeLessThan(0.05);
  });

  it('is compared over the shortest, and silence is like nothing', () => {
    expect(repeats([drum(1), drum(1).subarray(0, 100)])).toBeCloseTo(1, 9);
    expect(repeats([drum(1), new Float64Array(240)])).toBe(0);
  });

  it("can't be told of one hit", () => {
    expect(repeats([])).toBeNull();
    expect(repeats([drum(1)])).toBeNull();
  });
});
