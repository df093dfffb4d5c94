import { randomNumbers } from '../../testing/randomNumbers';
import { createPhaseTransform } from './phaseTransform';

const sampleRateHz = 48000;
const length = 2016;
const range = { fromMs: -20, toMs: 30 };

/** Sound written as a sum of sines from 100 to 4000 Hz, so that it can be delayed by any part of a sample. */
const sound = (seed: number) => {
  const random = randomNumbers(seed);
  const tones = Array.from({ length: 150 }, (_, i) => ({
    hz: 100 + 26 * i + 10 * random(),
    phase: 3.1 * random(),
  }));
  return (delaySamples: number): Float64Array =>
    Float64Array.from({ length }, (_, i) =>
      tones.reduce(
        (sum, { hz, phase }) =>
          sum + Math.sin((2 * Math.PI * hz * (i - delaySamples)) / sampleRateHz + phase),
        0,
      ),
    );
};

describe('the phase transform', () => {
  // Delays of 80–6000 Hz noise, as read by a phase transform in SciPy: 137.001, −42.000, 10.294 …; 0.05 samples.
  it.each([137, -42, 10.3, 97.5, 0.25])('finds a delay of %s samples', (delay) => {
    const transform = createPhaseTransform(sampleRateHz);
    for (let seed = 1; seed <= 4; seed += 1) transform.add(sound(seed)(0), sound(seed)(delay));
    const [best] = transform.peaks(range);
    expect(Math.abs((best.lagMs * sampleRateHz) / 1000 - delay)).toBeLessThan(0.05);
    expect(best.height).toBeGreaterThan(0.5);
  });

  it('finds an inverted copy at its delay with a negative height', () => {
    const transform = createPhaseTransform(sampleRateHz);
    transform.add(
      sound(1)(0),
      sound(1)(20).map((x) => -x),
    );
    const [best] = transform.peaks(range);
    // An inverted copy 20 samples later has its largest absolute value at 20, negative: 0.02 samples.
    expect(Math.abs((best.lagMs * sampleRateHz) / 1000 - 20)).toBeLessThan(0.02);
    expect(best.height).toBeLessThan(-0.5);
  });

  it('turns its lags round when the microphones are swapped', () => {
    const forwards = createPhaseTransform(sampleRateHz);
    forwards.add(sound(3)(0), sound(3)(33));
    const backwards = createPhaseTransform(sampleRateHz);
    backwards.add(sound(3)(33), sound(3)(0));
    expect(backwards.peaks(range)[0].lagMs).toBeCloseTo(-forwards.peaks(range)[0].lagMs, 6);
  });

  it('does not mind how loud either microphone is', () => {
    const transform = createPhaseTransform(sampleRateHz);
    transform.add(
      sound(2)(0),
      sound(2)(50).map((x) => x * 1e-4),
    );
    expect((transform.peaks(range)[0].lagMs * sampleRateHz) / 1000).toBeCloseTo(50, 1);
  });

  it('finds nothing high in sounds that know nothing of each other', () => {
    const transform = createPhaseTransform(sampleRateHz);
    for (let seed = 1; seed <= 8; seed += 1) transform.add(sound(seed)(0), sound(seed + 50)(0));
    expect(Math.abs(transform.peaks(range)[0].height)).toBeLessThan(0.5);
  });

  it('tells each hit its own lag', () => {
    const transform = createPhaseTransform(sampleRateHz);
    for (const delay of [47, 48, 49]) transform.add(sound(delay)(0), sound(delay)(delay));
    const lags = transform.lagsPerHit(1).map((lagMs) => Math.round((lagMs * sampleRateHz) / 1000));
    expect(lags).toEqual([47, 48, 49]);
  });

  it('has no peaks without hits and with silence', () => {
    expect(createPhaseTransform(sampleRateHz).peaks(range)).toEqual([]);
    const transform = createPhaseTransform(sampleRateHz);
    transform.add(new Float64Array(length), new Float64Array(length));
    expect(transform.peaks(range)).toEqual([]);
  });
});
