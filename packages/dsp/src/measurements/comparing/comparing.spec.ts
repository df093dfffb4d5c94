import { medianDifference } from './medianDifference';
import { seededRandom } from './seededRandom';
import { strengthMatch } from './strengthMatch';
import { takeChange, worthSteps } from './takeChange';

/** Normally spread values (Box–Muller). */
const spread = (random: () => number, count: number, { middle, sigma }: { middle: number; sigma: number }) =>
  Array.from(
    { length: count },
    () => middle + sigma * Math.sqrt(-2 * Math.log(1 - random())) * Math.cos(2 * Math.PI * random()),
  );

describe('the difference of two medians', () => {
  it('is after minus before, with an interval around it', () => {
    const random = seededRandom(4);
    const told = medianDifference(
      spread(random, 40, { middle: -9, sigma: 1 }),
      spread(random, 40, { middle: -6, sigma: 1 }),
    );
    expect(told?.interval.low).toBeLessThan(told?.difference ?? NaN);
    expect(told?.interval.high).toBeGreaterThan(told?.difference ?? NaN);
    // Standard error of a median: 1.2533·σ/√n each (normal values), so 1.96 · 0.28 = 0.55 either way.
    expect(Math.abs((told?.difference ?? NaN) - 3)).toBeLessThan(0.6);
    const width = (told?.interval.high ?? NaN) - (told?.interval.low ?? NaN);
    expect(Math.abs(width - 1.1)).toBeLessThan(0.5);
  });

  it('is the same every time, and turns round with the takes', () => {
    const [a, b] = [
      [1, 2, 4, 7, 3, 2],
      [5, 6, 4, 9, 8, 5],
    ];
    expect(medianDifference(a, b)).toEqual(medianDifference(a, b));
    const [there, back] = [medianDifference(a, b), medianDifference(b, a)];
    expect(back?.difference).toBe(-(there?.difference ?? NaN));
    // Other draws, so nearly and not wholly the same.
    expect(Math.abs((back?.interval.low ?? NaN) + (there?.interval.high ?? NaN))).toBeLessThan(0.6);
  });

  it('can’t be told of nothing', () => {
    expect(medianDifference([], [1])).toBeNull();
    expect(medianDifference([1], [3])).toEqual({ difference: 2, interval: { low: 2, high: 2 } });
  });
});

describe('hits struck alike', () => {
  it('lie within 3 dB of both takes’ medians', () => {
    // Medians −10 and −8.
    const match = strengthMatch([-16, -11, -10, -7, -9.5], [-8, -5, -7, -8.2, -12]);
    expect(match).toEqual({ before: [1, 2, 3, 4], after: [0, 2, 3] });
  });

  it('are none where one take was played far harder, or holds no hit', () => {
    expect(strengthMatch([-20, -20, -20], [-10, -10, -10])).toEqual({ before: [], after: [] });
    expect(strengthMatch([], [-10])).toEqual({ before: [], after: [] });
  });
});

describe('a change from take to take', () => {
  const level = (before: readonly number[], after: readonly number[]) =>
    takeChange({ before, after }, worthSteps.peakDb);

  it('needs six hits a side', () => {
    expect(level(Array(5).fill(1), Array(8).fill(9))).toEqual({
      change: null,
      interval: null,
      clear: false,
      reason: 'too-few-hits',
    });
    expect(level(Array(6).fill(1), Array(6).fill(9))).toMatchObject({ change: 8, clear: true });
  });

  it('is clear only when it exceeds its step', () => {
    expect(level(Array(8).fill(0), Array(8).fill(0.9)).clear).toBe(false);
    expect(level(Array(8).fill(0), Array(8).fill(-1.1)).clear).toBe(true);
  });

  it('counts decay in shares, the same way up and down', () => {
    const decay = (before: number, after: number) =>
      takeChange({ before: Array(6).fill(before), after: Array(6).fill(after) }, worthSteps.decayS);
    expect(decay(0.5, 0.4).change).toBeCloseTo(-0.2, 12);
    expect([decay(0.5, 0.4), decay(0.4, 0.5)].map(({ clear }) => clear)).toEqual([true, true]);
    expect(decay(0.5, 0.53).clear).toBe(false);
  });

  it('is rarely told where nothing changed, and seldom missed where much did', () => {
    const random = seededRandom(9);
    // Peaks of a steady player lie within about 1.2 dB.
    const told = (change: number) =>
      Array.from({ length: 150 }, () =>
        level(
          spread(random, 8, { middle: -9, sigma: 1.2 }),
          spread(random, 8, { middle: -9 + change, sigma: 1.2 }),
        ),
      ).filter(({ clear }) => clear).length / 150;
    // 2–3 % seen with eight hits a side (docs/measurements.md, 8); two standard errors of 150 pairs more.
    expect(told(0)).toBeLessThan(0.06);
    expect(told(3)).toBeGreaterThan(0.9);
  });
});
