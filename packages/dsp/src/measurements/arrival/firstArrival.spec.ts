import { firstArrival } from './firstArrival';

const sampleRateHz = 48000;
const range = { sampleRateHz, from: 960, to: 3000 };
/** Silence, or a steady tone, and from 1500 on a burst that rises to 1. */
const burst = ({ before = 0, sign = 1 } = {}): Float64Array =>
  Float64Array.from({ length: 4000 }, (_, i) => {
    const ring = before * Math.sin((2 * Math.PI * 400 * i) / sampleRateHz);
    return i < 1500 ? ring : ring + sign * Math.sin((Math.PI * (i - 1500)) / 60) * Math.exp((1500 - i) / 300);
  });

describe('a first arrival', () => {
  it('is where a tenth of the peak is passed, between samples', () => {
    const found = firstArrival(burst(), range);
    const peak = burst().reduce((most, x) => Math.max(most, Math.abs(x)), 0);
    expect(found?.at).toBeGreaterThan(1501);
    expect(found?.at).toBeLessThan(1504);
    expect(burst()[Math.ceil(found?.at ?? 0)]).toBeGreaterThanOrEqual(0.1 * peak);
    expect(found).toMatchObject({ swing: 'up', clear: true });
  });

  it('moves with the sound and not with its level or sign', () => {
    const at = firstArrival(burst(), range)?.at ?? NaN;
    const sound = burst();
    const later = sound.map((_, i) => sound[i - 77] ?? 0);
    expect(firstArrival(later, range)?.at).toBeCloseTo(at + 77, 6);
    expect(
      firstArrival(
        burst().map((x) => x / 1024),
        range,
      )?.at,
    ).toBeCloseTo(at, 6);
    expect(firstArrival(burst({ sign: -1 }), range)).toMatchObject({ swing: 'down' });
  });

  it('must pass twice what sounded just before', () => {
    const late = firstArrival(burst({ before: 0.15 }), range);
    expect(late?.at).toBeGreaterThan(firstArrival(burst(), range)?.at ?? NaN);
    expect(firstArrival(burst({ before: 0.15 }), range)?.clear).toBe(true);
    expect(firstArrival(burst({ before: 0.3 }), range)?.clear).toBe(false);
  });

  it('is none in silence and in a steady tone', () => {
    expect(firstArrival(new Float64Array(4000), range)).toBeNull();
    const tone = Float64Array.from({ length: 4000 }, (_, i) =>
      Math.sin((2 * Math.PI * 400 * i) / sampleRateHz),
    );
    expect(firstArrival(tone, range)).toBeNull();
  });
});
