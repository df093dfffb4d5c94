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
  it('is BS.1770-5 Annex 1, Tables 1 and 2, at 48 kHz', () => {
    const [shelf, lowCut] = kWeighting(48000);
    const table: [number, number][] = [
      [shelf.b0, 1.53512485958697],
      [shelf.b1, -2.69169618940638],
      [shelf.b2, 1.19839281085285],
      [shelf.a1, -1.69065929318241],
      [shelf.a2, 0.73248077421585],
      [lowCut.b0, 1],
      [lowCut.b1, -2],
      [lowCut.b2, 1],
      [lowCut.a1, -1.99004745483398],
      [lowCut.a2, 0.99007225036621],
    ];
    // Printed with 14 decimals.
    for (const [ours, printed] of table) expect(ours).toBeCloseTo(printed, 12);
  });

  // check-values 1.3, gain of the tables; "same frequency response" at other rates, ±0.01 dB suggested there.
  const response = [
    [20, -13.2754],
    [63, -2.6639],
    [100, -1.1335],
    [500, 0.0425],
    [997, 0.691],
    [2000, 3.0713],
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
