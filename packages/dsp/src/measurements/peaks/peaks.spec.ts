import { randomNumbers } from '../../testing/randomNumbers';
import { createPeaks, type TrackPeaks } from './peaks';
import { decodeOutline, decodePeaks, encodeOutline, encodePeaks, outlineOf } from './peaksBytes';

const ramp = (frames: number): Float32Array =>
  Float32Array.from({ length: frames }, (_, i) => (2 * i) / (frames - 1) - 1);

function peaksOf(samples: Float32Array, stepsPerLevel?: number[], blockSize = samples.length): TrackPeaks {
  const meter = createPeaks({ frames: samples.length, stepsPerLevel });
  for (let i = 0; i < samples.length; i += blockSize) meter.push(samples.subarray(i, i + blockSize));
  return meter.result();
}

describe('the outline of a track', () => {
  it('holds the lowest and the highest sample of each step', () => {
    const samples = Float32Array.of(0, 0.5, -0.25, 0.1, 1, -1, 0.2, 0.3);
    expect(peaksOf(samples, [2, 4])).toEqual([
      { steps: 2, pairs: Int8Array.of(-32, 64, -127, 127) },
      { steps: 4, pairs: Int8Array.of(0, 64, -32, 13, -127, 127, 25, 38) },
    ]);
  });

  it('is what looking at every sample gives, where frames and steps don’t divide', () => {
    const random = randomNumbers(7);
    const samples = Float32Array.from({ length: 10_007 }, random);
    for (const { steps, pairs } of peaksOf(samples, [25, 100, 700])) {
      for (let k = 0; k < steps; k += 1) {
        const part = samples.subarray(
          Math.floor((k * 10_007) / steps),
          Math.floor(((k + 1) * 10_007) / steps),
        );
        expect([pairs[2 * k], pairs[2 * k + 1]]).toEqual(
          [Math.min(...part), Math.max(...part)].map((x) => Math.round(127 * x)),
        );
      }
    }
  });

  it('is the same however the samples come', () => {
    const samples = Float32Array.from({ length: 5000 }, randomNumbers(3));
    for (const blockSize of [1, 7, 4999])
      expect(peaksOf(samples, [10, 500], blockSize)).toEqual(peaksOf(samples, [10, 500]));
  });

  it('turns over with the track', () => {
    const samples = ramp(999);
    const [level] = peaksOf(samples, [9]);
    const [turned] = peaksOf(
      samples.map((x) => -x),
      [9],
    );
    expect([...turned.pairs]).toEqual([...level.pairs].map((_, i, all) => -all[i ^ 1] + 0));
  });

  it('stops at full scale, and has no more steps than there are samples', () => {
    expect(peaksOf(Float32Array.of(-3, 2, 0.5))).toEqual([
      { steps: 3, pairs: Int8Array.of(-127, -127, 127, 127, 64, 64) },
    ]);
    expect(peaksOf(ramp(3000)).map((level) => level.steps)).toEqual([500, 2000]);
    expect(peaksOf(ramp(20_000)).map((level) => level.steps)).toEqual([500, 2000, 8000]);
  });

  it('is silent where the track ends early, and looks at nothing beyond its length', () => {
    const meter = createPeaks({ frames: 4, stepsPerLevel: [4] });
    meter.push(Float32Array.of(0.5));
    expect(meter.result()[0].pairs).toEqual(Int8Array.of(64, 64, 0, 0, 0, 0, 0, 0));
    meter.push(new Float32Array(9).fill(-1));
    expect(meter.result()[0].pairs).toEqual(Int8Array.of(64, 64, -127, -127, -127, -127, -127, -127));
  });

  it('refuses steps that don’t divide each other', () => {
    for (const stepsPerLevel of [[3, 10], [0], [1.5], []]) {
      expect(() => createPeaks({ frames: 100, stepsPerLevel })).toThrow('divides the next');
    }
  });
});

describe('outlines as bytes', () => {
  const tracks = [peaksOf(ramp(9000)), peaksOf(ramp(9000).map((x) => -x / 2))];

  it('come back as they were stored', () => {
    for (const track of tracks) expect(decodePeaks(encodePeaks(track))).toEqual(track);
    const shifted = new Uint8Array(encodePeaks(tracks[0]).length + 3);
    shifted.set(encodePeaks(tracks[0]), 3);
    expect(decodePeaks(shifted.subarray(3))).toEqual(tracks[0]);
  });

  it('are refused when they were cut', () => {
    const bytes = encodePeaks(tracks[0]);
    for (const length of [0, 3, 10, bytes.length - 1]) {
      expect(() => decodePeaks(bytes.subarray(0, length))).toThrow('bytes long');
    }
  });

  it.each([
    [100, 500],
    [500, 500],
    [501, 2000],
    [1500, 2000],
    [8000, 8000],
    [9000, 8000],
  ])('%s steps asked for: %s', (asked, steps) => {
    const outline = outlineOf(tracks, asked);
    expect(outline.steps).toBe(steps);
    const bytes = encodeOutline(outline);
    expect(bytes).toHaveLength(2 * 2 * steps);
    // The contract's layout: lowest and highest of each step, one track after the other.
    expect((bytes[0] << 24) >> 24).toBe(-127);
    expect(bytes[2 * steps + 1]).toBe(64);
    expect(decodeOutline(bytes, { steps, tracks: 2 })).toEqual(outline);
    expect(() => decodeOutline(bytes, { steps, tracks: 1 })).toThrow('bytes long');
  });
});
