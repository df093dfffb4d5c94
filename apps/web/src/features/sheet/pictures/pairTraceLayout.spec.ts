import { apartPath, largest, sampleTrace, togetherPath, togetherShare } from './pairTraceLayout';

const sampleRateHz = 48_000;
const ramp = (slope: number) => Float32Array.from({ length: 4800 }, (_, i) => slope * i);
const excerpt = { sampleRateHz, startS: 1 };
const scale = { x: (i: number) => i, y: (v: number) => -v };

describe('the pair trace', () => {
  it('reads both microphones at the same times of the take', () => {
    const signals = { kick: ramp(1), overhead: ramp(2) };
    const points = sampleTrace({
      signals,
      excerpt,
      hitS: 1.02,
      view: { fromMs: -6, toMs: 44 },
      shiftMs: 0,
      count: 51,
    });
    // The window begins 6 ms before the hit: 14 ms into the excerpt, sample 672.
    expect(points.kick[0]).toBeCloseTo(672, 6);
    expect(points.overhead[0]).toBeCloseTo(1344, 6);
    expect(points.kick[50]).toBeCloseTo(672 + 2400, 6);
  });

  it('shows a shifted overhead earlier and leaves the kick', () => {
    const signals = { kick: ramp(1), overhead: ramp(1) };
    const points = sampleTrace({
      signals,
      excerpt,
      hitS: 1.02,
      view: { fromMs: -6, toMs: 44 },
      shiftMs: 1.6,
      count: 51,
    });
    expect(points.overhead[0] - points.kick[0]).toBeCloseTo(0.0016 * sampleRateHz, 6);
  });

  it('is silent outside the excerpt rather than wrong', () => {
    const signals = { kick: ramp(1), overhead: ramp(1) };
    const points = sampleTrace({
      signals,
      excerpt,
      hitS: 1,
      view: { fromMs: -6, toMs: 44 },
      shiftMs: 0,
      count: 51,
    });
    expect(points.kick[0]).toBe(0);
  });

  it('tints what both share while they push together and hatches what pulls apart', () => {
    const together = { kick: Float64Array.of(0, 2, 2), overhead: Float64Array.of(0, 1, 3) };
    expect(togetherPath(together, scale)).toBe('M0.0 0.0L1.0 -1.0L2.0 -2.0L2.0 0.0L0.0 0.0Z');
    expect(apartPath(together, scale)).toBe('');
    const apart = { kick: Float64Array.of(1, 1, 1), overhead: Float64Array.of(1, -1, -1) };
    expect(apartPath(apart, scale)).toBe('M1.0 -1.0L2.0 -1.0L2.0 1.0L1.0 1.0Z');
  });

  it('turning the overhead over swaps the two', () => {
    const kick = Float64Array.from({ length: 400 }, (_, i) => Math.sin(i / 9));
    const overhead = Float64Array.from({ length: 400 }, (_, i) => Math.sin(i / 9 + 1));
    const share = togetherShare({ kick, overhead });
    const flipped = togetherShare({ kick, overhead: overhead.map((v) => -v) });
    expect(share + flipped).toBeCloseTo(1, 9);
    expect(share).toBeGreaterThan(0.5);
  });

  it('never divides by silence', () => {
    expect(largest(new Float32Array(3), new Float32Array(3))).toBe(1);
  });
});
