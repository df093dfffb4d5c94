import { delayedPair } from '../../testing/delayedPair';
import { polarityChanged } from './polarityChanged';

describe('whether the polarity changed between two takes', () => {
  // Both cross spectra are written down from e^(jωD), so the figure is the mean of ±cos(2πf(D₂ − D₁)) over 30–150 Hz.
  const meanCosine = (ms: number): number => {
    const steps = Array.from({ length: 4096 }, (_, i) => 30 + (120 * (i + 0.5)) / 4096);
    return steps.reduce((sum, hz) => sum + Math.cos((2 * Math.PI * hz * ms) / 1000), 0) / steps.length;
  };

  it.each([
    [0, 1, 1],
    [0, -1, -1],
    [1, 1, meanCosine(1)],
    [1, -0.2, -meanCosine(1)],
    [3, 1, meanCosine(3)],
  ])('overhead %s ms later and %s times as loud', (ms, gain, expected) => {
    const found = polarityChanged(delayedPair({ delayMs: 1.6 }), delayedPair({ delayMs: 1.6 + ms, gain }));
    // Bins of 2.9 Hz stand for the integral: a thousandth.
    expect(found).toBeCloseTo(expected, 3);
  });

  it('is the same whichever take is first, and however loud they are', () => {
    const [a, b] = [delayedPair({ delayMs: 1 }), delayedPair({ delayMs: 2, gain: -0.01 })];
    expect(polarityChanged(a, b)).toBeCloseTo(polarityChanged(b, a) ?? NaN, 12);
    expect(polarityChanged(a, b)).toBeCloseTo(
      polarityChanged(a, delayedPair({ delayMs: 2, gain: -3 })) ?? NaN,
      6,
    );
  });

  it('can’t be told from silence, or from spectra with other bins', () => {
    const pair = delayedPair();
    expect(polarityChanged(pair, delayedPair({ gain: 0 }))).toBeNull();
    expect(polarityChanged(pair, { ...pair, binHz: 44100 / 16384 })).toBeNull();
  });
});
