import { SignalError } from '../../assert';
import type { Biquad } from '../filters/butterworth';
import { kWeighting } from './kWeighting';

/** |H| of all sections at f, dB. */
const gainDb = (sections: readonly Biquad[], frequencyHz: number, sampleRateHz: number): number => {
  const w = (2 * Math.PI * frequencyHz) / sampleRateHz;
  const size = (c0: number, c1: number, c2: number): number =>
    Math.hypot(c0 + c1 * Math.cos(w) + c2 * Math.cos(2 * w), c1 * Math.sin(w) + c2 * Math.sin(2 * w));
  return sections.reduce(
    (sum, { b0, b1, b2, a1, a2 }) => sum + 20 * Math.log10(size(b0, b1, b2) / size(1, a1, a2)),
    0,
  );
};

describe('the K-weighting', () => {
  // 48 kHz: BS.1770-5 Annex 1, Tables 1 and 2, printed with 14 decimals. 44.1 and 96 kHz: the same response through the
  // bilinear transform, the low cut's numerator scaled to it (libebur128's parametric form, computed with SciPy).
  it.each([
    [
      48000,
      [1.53512485958697, -2.69169618940638, 1.19839281085285, -1.69065929318241, 0.73248077421585],
      [1, -1.99004745483398, 0.99007225036621],
    ],
    [
      44100,
      [1.53084123005035, -2.65097999515473, 1.16907907992159, -1.66365511325602, 0.71259542807323],
      [0.99956006454251, -1.9891696736298, 0.98919903578704],
    ],
    [
      96000,
      [1.5597142289758, -2.92674157825108, 1.37826120231582, -1.84460946989011, 0.85584332293064],
      [1.00249278898634, -1.99501754472472, 0.99502375904092],
    ],
  ])('has the coefficients of BS.1770-5 at %i Hz', (sampleRateHz, shelfTable, [scale, ...poles]) => {
    const [shelf, lowCut] = kWeighting(sampleRateHz);
    const ours = [shelf.b0, shelf.b1, shelf.b2, shelf.a1, shelf.a2];
    ours.forEach((value, i) => expect(value).toBeCloseTo(shelfTable[i], 11));
    [lowCut.b0, lowCut.b1 / -2, lowCut.b2].forEach((value) => expect(value).toBeCloseTo(scale, 11));
    [lowCut.a1, lowCut.a2].forEach((value, i) => expect(value).toBeCloseTo(poles[i], 11));
  });

  // Gain of BS.1770-5's tables, "the same frequency response" at other rates; ±0.01 dB is our reading of same.
  const response = [
    [20, -13.2754],
    [31.5, -7.79],
    [63, -2.6639],
    [100, -1.1335],
    [250, -0.1529],
    [500, 0.0425],
    [997, 0.691],
    [2000, 3.0713],
    [4000, 3.968],
    [10000, 4.0419],
    [20000, 4.0431],
  ] as const;
  it.each([44100, 48000, 96000, 192000])('has the same response at %i Hz', (sampleRateHz) => {
    for (const [frequencyHz, expectedDb] of response) {
      expect(Math.abs(gainDb(kWeighting(sampleRateHz), frequencyHz, sampleRateHz) - expectedDb)).toBeLessThan(
        0.01,
      );
    }
  });

  it('refuses a rate that can’t be', () => {
    expect(() => kWeighting(0)).toThrow(SignalError);
    expect(() => kWeighting(NaN)).toThrow(SignalError);
  });
});
