import { loopEnds } from './loopBuffer';

describe('the ends of a loop', () => {
  it('start and end at silence and leave the middle as it was', () => {
    const samples = new Float32Array(48_000).fill(0.5);
    const looped = loopEnds(samples, 48_000);
    expect(looped[0]).toBe(0);
    expect(looped.at(-1)).toBe(0);
    expect(looped[24_000]).toBe(0.5);
    expect(samples[0]).toBe(0.5);
  });

  it('never let two neighbouring samples jump', () => {
    const looped = loopEnds(new Float32Array(48_000).fill(1), 48_000);
    const steps = looped.slice(1).map((value, i) => Math.abs(value - looped[i]));
    // One sample of the 3 ms fade at 48 kHz.
    expect(Math.max(...steps)).toBeLessThan(1 / 143);
  });
});
