import { seededNoise } from './testing/seededNoise';
import { createTrackLevel, type TrackLevelFacts, type TrackLevelOptions } from './trackLevel';

const sampleRateHz = 48000;
const step24 = 2 ** -23;

function level(samples: Float32Array, options: Partial<TrackLevelOptions> = {}): TrackLevelFacts {
  const meter = createTrackLevel({ sampleRateHz, quantisationStep: step24, ...options });
  meter.push(samples);
  return meter.result();
}

function sine(options: {
  frequencyHz: number;
  seconds: number;
  amplitude?: number;
  phase?: number;
}): Float32Array {
  const { frequencyHz, seconds, amplitude = 1, phase = 0 } = options;
  return Float32Array.from(
    { length: seconds * sampleRateHz },
    (_, i) => amplitude * Math.sin((2 * Math.PI * frequencyHz * i) / sampleRateHz + phase),
  );
}

describe('peak and power', () => {
  it('reads a full-scale sine at −3.01 dBFS RMS and a square at 0, peak-referenced', () => {
    // Peak convention (SoX stats, ffmpeg astats): −3.01 and 0.00, tolerance 0.01.
    const tone = level(sine({ frequencyHz: 1000, seconds: 1, phase: Math.PI / 2 }));
    expect(tone.rmsDbfs).toBeCloseTo(-3.0103, 3);
    expect(tone.samplePeakDbfs).toBeCloseTo(0, 6);
    expect(tone.crestFactorDb).toBeCloseTo(3.0103, 3);
    expect(level(sine({ frequencyHz: 1000, seconds: 1, phase: 0.1 }).map(Math.sign)).rmsDbfs).toBeCloseTo(
      0,
      6,
    );
  });

  it('reads a −20 dBFS peak tone at −23.01 dBFS RMS', () => {
    // A tone of amplitude A has the power A²/2.
    expect(level(sine({ frequencyHz: 997, seconds: 1, amplitude: 0.1 })).rmsDbfs).toBeCloseTo(-23.0103, 3);
  });

  it('finds the largest sample of either sign and where it first is', () => {
    const samples = new Float32Array(sampleRateHz);
    samples[100] = 0.4;
    samples[12000] = -0.5;
    samples[24000] = 0.5;
    expect(level(samples)).toMatchObject({ samplePeakDbfs: 20 * Math.log10(0.5), samplePeakAtS: 0.25 });
    expect(level(samples).headroomDb).toBeCloseTo(6.0206, 4);
  });

  // SNR = 20·lg(2^N·√1.5) (Analog Devices MT-001), and what SciPy reads of an undithered 997 Hz tone; tolerance 0.25.
  it.each([
    [8, 49.95],
    [16, 98.07],
    [24, 146.2],
  ])('reads %i-bit quantisation of a full-scale sine %f dB below it', (bits, referenceDb) => {
    const fullScale = 2 ** (bits - 1);
    let signal = 0;
    const error = Float32Array.from({ length: sampleRateHz }, (_, i) => {
      const x = (1 - 1 / fullScale) * Math.sin((2 * Math.PI * 997 * i) / sampleRateHz);
      signal += x * x;
      // A float32 can't hold a 24-bit error beside its signal, so the difference is made before.
      return Math.round(x * fullScale) / fullScale - x;
    });
    const signalDbfs = 10 * Math.log10(signal / sampleRateHz);
    const snrDb = signalDbfs - (level(error).rmsDbfs ?? 0);
    expect(Math.abs(snrDb - (6.0206 * bits + 1.7609))).toBeLessThan(0.25);
    expect(Math.abs(snrDb - referenceDb)).toBeLessThan(0.25);
  });

  it('reads the mean as DC offset, whatever lies on top', () => {
    const tone = sine({ frequencyHz: 50, seconds: 1, amplitude: 0.3 });
    expect(level(tone.map((x) => x + 0.002)).dcOffset).toBeCloseTo(0.002, 6);
    expect(level(tone).dcOffset).toBeCloseTo(0, 6);
  });

  it('moves every level by 6.02 dB for half the signal, and none for its inverse', () => {
    const noise = seededNoise({ length: 2 * sampleRateHz, rms: 0.1, seed: 4 });
    const [whole, half, inverse] = [noise, noise.map((x) => x / 2), noise.map((x) => -x)].map((x) =>
      level(x),
    );
    for (const figure of ['samplePeakDbfs', 'rmsDbfs', 'noiseFloorDbfs'] as const) {
      expect((whole[figure] ?? 0) - (half[figure] ?? 0)).toBeCloseTo(6.0206, 3);
      expect(inverse[figure]).toBe(whole[figure]);
    }
    expect(half.crestFactorDb).toBeCloseTo(whole.crestFactorDb ?? 0, 6);
    expect(inverse.dcOffset).toBeCloseTo(-whole.dcOffset, 12);
  });

  it('has no level for silence, and says so with null', () => {
    expect(level(new Float32Array(3 * sampleRateHz))).toEqual({
      samplePeakDbfs: null,
      samplePeakAtS: null,
      truePeakDbtp: null,
      headroomDb: null,
      rmsDbfs: null,
      crestFactorDb: null,
      integratedLufs: null,
      dcOffset: 0,
      clipping: { runs: [], runCount: 0, clippedSamples: 0 },
      looksFlattened: false,
      dropouts: { count: 0, firstAtS: null },
      noiseFloorDbfs: null,
      noiseFloorReason: 'digital-silence',
    });
  });

  it('measures a single sample, and nothing at all', () => {
    expect(level(Float32Array.of(-0.5))).toMatchObject({
      samplePeakAtS: 0,
      crestFactorDb: 0,
      dcOffset: -0.5,
    });
    expect(level(new Float32Array(0))).toMatchObject({ samplePeakDbfs: null, rmsDbfs: null, dcOffset: 0 });
  });
});

describe('clipping at full scale', () => {
  const clippingOf = (samples: number[], quantisationStep: number | null) =>
    level(Float32Array.from(samples), { quantisationStep }).clipping;
  const top = 1 - 2 ** -15;

  it('finds runs of three samples or more, with start, length and level', () => {
    const { runs, runCount, clippedSamples } = clippingOf([0, top, top, top, 0.2, -1, -1, -1, -1], 2 ** -15);
    expect(runs).toEqual([
      { startSample: 1, lengthSamples: 3, levelDbfs: 20 * Math.log10(top) },
      { startSample: 5, lengthSamples: 4, levelDbfs: 0 },
    ]);
    expect([runCount, clippedSamples]).toEqual([2, 7]);
  });

  it('lets two samples pass, and three that change sign', () => {
    expect(clippingOf([top, top, 0, -1, -1, 0, top, -1, top], 2 ** -15).runCount).toBe(0);
  });

  it('draws the line two quantisation steps below full scale', () => {
    const flat = (steps: number) => Array<number>(3).fill(1 - steps * 2 ** -15);
    expect(clippingOf(flat(2), 2 ** -15).runCount).toBe(1);
    expect(clippingOf(flat(3), 2 ** -15).runCount).toBe(0);
    expect(clippingOf(flat(2), step24).runCount).toBe(0);
  });

  it('draws the line at 0.9999 for float files', () => {
    expect(clippingOf([0.99995, 0.99991, 1], null).runCount).toBe(1);
    expect(clippingOf([0.9998, 0.9998, 0.9998], null).runCount).toBe(0);
  });

  it('calls overs of a float file clipped only where they are flat', () => {
    const over = Float32Array.from(sine({ frequencyHz: 60, seconds: 0.2, amplitude: 1.8 }));
    expect(level(over, { quantisationStep: null }).clipping.runCount).toBe(0);
    // Peaks at ±1.4 once a half period: 60 Hz for 0.2 s has 24 of them.
    const cut = over.map((x) => Math.max(-1.4, Math.min(1.4, x)));
    expect(level(cut, { quantisationStep: null }).clipping.runCount).toBe(24);
  });

  it('counts every run but keeps the first 200', () => {
    const many = Array.from({ length: 1000 }, (_, i) => (i % 4 === 3 ? 0 : 1));
    const clipping = clippingOf(many, step24);
    expect([clipping.runs.length, clipping.runCount, clipping.clippedSamples]).toEqual([200, 250, 750]);
  });

  it('finds no clipping in a full-scale 1 kHz tone that never stands still', () => {
    expect(level(sine({ frequencyHz: 1000, seconds: 1, amplitude: 1 - step24 })).clipping.runCount).toBe(0);
  });
});

describe('noise floor', () => {
  const noise = (seconds: number, levelDbfs: number, seed = 7) =>
    seededNoise({ length: seconds * sampleRateHz, rms: 10 ** (levelDbfs / 20), seed });
  const joined = (...parts: Float32Array[]) => Float32Array.from(parts.flatMap((part) => [...part]));
  const decay = (seconds: number) =>
    noise(seconds, -10).map((x, i) => x * Math.exp(-i / (0.15 * sampleRateHz)));

  it('reads the quiet before the playing', () => {
    // 0.7 dB is the error the definition was tried with; a mean over one second of noise is far closer.
    const take = joined(noise(3, -72), noise(4, -20), decay(0.4));
    expect(Math.abs((level(take).noiseFloorDbfs ?? 0) + 72)).toBeLessThan(0.2);
  });

  it('tells where it was measured', () => {
    const meter = createTrackLevel({ sampleRateHz, quantisationStep: step24 });
    meter.push(joined(noise(2, -20), noise(1, -72), noise(2, -20)));
    // Cut into frames of 50 ms, so the quiet second is met exactly.
    expect(meter.quietStretch()).toEqual({ startFrame: 2 * sampleRateHz, endFrame: 3 * sampleRateHz });
    const busy = createTrackLevel({ sampleRateHz, quantisationStep: step24 });
    busy.push(decay(0.4));
    expect(busy.quietStretch()).toBeNull();
  });

  it('leaves a constant offset out of it', () => {
    const take = noise(3, -72).map((x) => x + 0.005);
    expect(Math.abs((level(take).noiseFloorDbfs ?? 0) + 72)).toBeLessThan(0.2);
  });

  it('does not take a ringing-out cymbal for noise', () => {
    // −20 dB a second: every stretch stays within 6 dB or not, but its halves differ by 10 dB.
    const ringing = noise(6, -20).map((x, i) => x * 10 ** (-i / sampleRateHz));
    expect(level(ringing)).toMatchObject({ noiseFloorDbfs: null, noiseFloorReason: 'no-quiet-second' });
  });

  it('is null on a take trimmed tight and on one that never rests', () => {
    expect(level(noise(0.9, -70))).toMatchObject({ noiseFloorDbfs: null, noiseFloorReason: 'too-short' });
    const hits = joined(...Array.from({ length: 10 }, () => decay(0.4)));
    expect(level(hits)).toMatchObject({ noiseFloorDbfs: null, noiseFloorReason: 'no-quiet-second' });
  });

  it('looks past digital silence for real noise, and tells when there is none', () => {
    const silence = new Float32Array(2 * sampleRateHz);
    expect(level(joined(silence, noise(2, -66))).noiseFloorDbfs).toBeCloseTo(-66, 0);
    expect(level(joined(silence, decay(0.5)))).toMatchObject({ noiseFloorReason: 'digital-silence' });
    expect(level(silence.map(() => 0.25))).toMatchObject({ noiseFloorReason: 'digital-silence' });
  });
});

const summed = ({
  rmsDbfs,
  crestFactorDb,
  noiseFloorDbfs,
  integratedLufs,
  dcOffset,
}: ReturnType<typeof level>) => ({
  rmsDbfs,
  crestFactorDb,
  noiseFloorDbfs,
  integratedLufs,
  dcOffset,
});
const apart = (a: ReturnType<typeof summed>, b: ReturnType<typeof summed>) =>
  Math.max(...Object.entries(a).map(([name, value]) => Math.abs(value! - b[name as keyof typeof b]!)));

describe('a track level', () => {
  it('gives the same figures however the track was cut into blocks', () => {
    const samples = seededNoise({ length: 100_003, rms: 0.5, seed: 11 }).map((x) =>
      Math.max(-1, Math.min(1, 1.3 * x)),
    );
    const whole = level(samples);
    expect(whole.clipping.runCount).toBeGreaterThan(0);
    for (const size of [1, 777, 4096]) {
      const meter = createTrackLevel({ sampleRateHz, quantisationStep: step24 });
      for (let i = 0; i < samples.length; i += size) meter.push(samples.subarray(i, i + size));
      const cut = meter.result();
      // What is added up in another order is rounded otherwise: 1e-12 of a sum, which is less than 1e-9 dB.
      expect({ ...cut, ...summed(whole) }).toEqual(whole);
      expect(apart(summed(cut), summed(whole))).toBeLessThan(1e-9);
    }
  });

  it('leaves its input as it was', () => {
    const samples = seededNoise({ length: 5000, rms: 0.3, seed: 2 });
    const before = [...samples];
    level(samples);
    expect([...samples]).toEqual(before);
  });

  it('refuses what is no number, and options that cannot be', () => {
    expect(() => level(Float32Array.of(0, NaN))).toThrow('holds a value that is no number');
    expect(() => level(Float32Array.of(Infinity))).toThrow('holds a value that is no number');
    expect(() => level(new Float32Array(1), { sampleRateHz: 0 })).toThrow(
      'sampleRateHz must be a finite number',
    );
    expect(() => level(new Float32Array(1), { quantisationStep: 1 })).toThrow(
      'quantisationStep must lie between',
    );
  });
});
