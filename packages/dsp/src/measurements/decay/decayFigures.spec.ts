import { randomNumbers } from '../../testing/randomNumbers';
import { decayFigures } from './decayFigures';

/** Mean power of each millisecond of e^(−13.8155·t/T). */
const exponential = (decayS: number, lengthS: number, level = 1): Float64Array => {
  const perHop = (6 * Math.LN10) / decayS / 1000;
  return Float64Array.from({ length: Math.round(lengthS * 1000) }, (_, i) => level * Math.exp(-perHop * i));
};
const sum = (a: Float64Array, b: Float64Array): Float64Array => a.map((value, i) => value + b[i]);
/** As a band of noise has it: each hop's power wanders. */
const wandering = (power: Float64Array, seed: number): Float64Array => {
  const random = randomNumbers(seed);
  return power.map((value) => value * -Math.log(Math.max(1e-6, Math.abs(random()))));
};

describe('the decay of one band', () => {
  // By theory; pyroomacoustics reads the same, ±1e-4 s.
  it.each([0.3, 0.8, 2])('of an exponential is what it was made with: %d s', (decayS) => {
    const { earlyS, t20S, earlyToLateDb } = decayFigures(exponential(decayS, 2.5 * decayS));
    expect(Math.abs((t20S ?? NaN) - decayS)).toBeLessThan(1e-4);
    expect(Math.abs((earlyS ?? NaN) - decayS)).toBeLessThan(1e-4);
    // C50 of an exponential: 10·lg(e^(13.8155·0.05/T) − 1).
    const expected = 10 * Math.log10(Math.exp((6 * Math.LN10 * 0.05) / decayS) - 1);
    expect(Math.abs((earlyToLateDb ?? NaN) - expected)).toBeLessThan(0.001);
  });

  it('is right for one cut after 36 dB, which reads 1 % short without the correction', () => {
    // Closed form: T = 1 s cut at 0.6 s reads 0.9875 uncorrected.
    expect(Math.abs((decayFigures(exponential(1, 0.6)).t20S ?? NaN) - 1)).toBeLessThan(0.002);
  });

  it('leaves out the background it sinks into, 45 dB down', () => {
    const noise = new Float64Array(2000).fill(10 ** -4.5);
    // 2.7 s where the background is integrated as well (computed with SciPy).
    expect(Math.abs((decayFigures(sum(exponential(1, 2), noise)).t20S ?? NaN) - 1)).toBeLessThan(0.02);
  });

  it('tells the early part of a bent decay apart', () => {
    // Computed with SciPy: 0.3 s with a tail of 1.5 s 20 dB down, early 0.3354 ± 0.002.
    const bent = sum(exponential(0.3, 4), exponential(1.5, 4, 0.01));
    expect(Math.abs((decayFigures(bent).earlyS ?? NaN) - 0.3354)).toBeLessThan(0.002);
  });

  it.each([0.3, 0.5, 0.8])('wanders little with noise: %d s', (decayS) => {
    const read = Array.from({ length: 20 }, (_, seed) => {
      const noise = new Float64Array(1500).fill(10 ** -5);
      return decayFigures(wandering(sum(exponential(decayS, 1.5), noise), seed + 1)).t20S ?? NaN;
    });
    // 6 % seen for single noise bursts in SciPy, and this is the worst of twenty; their mean is nearer.
    for (const t20S of read) expect(Math.abs(t20S / decayS - 1)).toBeLessThan(0.15);
    expect(Math.abs(read.reduce((all, value) => all + value, 0) / read.length / decayS - 1)).toBeLessThan(
      0.02,
    );
  });

  it('tells T20 only over 35 dB and the early part only over 20', () => {
    const toTwenty = [exponential(1, 0.5), exponential(0.5, 1)].map((power, i) =>
      decayFigures(power, i === 0 ? undefined : -30),
    );
    expect(toTwenty.map(({ t20S, earlyS }) => [t20S, earlyS !== null])).toEqual([
      [null, true],
      [null, true],
    ]);
    expect(decayFigures(exponential(1, 0.3))).toEqual({ earlyS: null, t20S: null, earlyToLateDb: null });
  });

  it('can tell nothing of silence, of a tone that stays, and of next to nothing', () => {
    const nothing = { earlyS: null, t20S: null, earlyToLateDb: null };
    expect(decayFigures(new Float64Array(500))).toEqual(nothing);
    expect(decayFigures(new Float64Array(500).fill(0.1))).toEqual(nothing);
    expect(decayFigures(exponential(0.5, 0.02))).toEqual(nothing);
  });

  it('leaves its input as it was', () => {
    const power = exponential(0.5, 1);
    const before = power.slice();
    decayFigures(power);
    expect(power).toEqual(before);
  });
});
