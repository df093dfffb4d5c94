import { seededNoise } from './testing/seededNoise';
import { createTruePeak } from './truePeak';
import { truePeakPhases } from './truePeakFilter';

const sampleRateHz = 48000;

function truePeak(samples: Float32Array, options: { rateHz?: number; size?: number } = {}): number {
  const { rateHz = sampleRateHz, size = Math.max(1, samples.length) } = options;
  const meter = createTruePeak({ sampleRateHz: rateHz });
  for (let i = 0; i < samples.length; i += size) meter.push(samples.subarray(i, i + size));
  return meter.result().truePeakDbtp ?? NaN;
}

/** Every output of every phase, as Annex 2 has it: no stretch left out. */
function interpolatedPeakDb(samples: Float32Array): number {
  let largest = samples.reduce((most, x) => Math.max(most, Math.abs(x)), 0);
  for (let i = 0; i < samples.length + 11; i += 1) {
    for (const taps of truePeakPhases) {
      const output = taps.reduce((sum, tap, k) => sum + tap * (samples[i - k] ?? 0), 0);
      largest = Math.max(largest, Math.abs(output));
    }
  }
  return 20 * Math.log10(largest);
}

/** A tone with straight fades of 10 ms (Tech 3341, cases 15–19). */
function tone(options: {
  perCycle: number;
  amplitude: number;
  phaseDeg: number;
  seconds?: number;
}): Float32Array {
  const { perCycle, amplitude, phaseDeg, seconds = 0.5 } = options;
  const length = seconds * sampleRateHz;
  const fade = 0.01 * sampleRateHz;
  return Float32Array.from({ length }, (_, i) => {
    const gain = Math.min(1, i / fade, (length - 1 - i) / fade);
    return gain * amplitude * Math.sin((2 * Math.PI * i) / perCycle + (phaseDeg * Math.PI) / 180);
  });
}

describe('the true peak', () => {
  // EBU Tech 3341 (November 2023), Table 1, cases 15–19: all +0.2 / −0.4 dB. The last column is what the filter of
  // BS.1770-5 reads, computed with SciPy; 0.005 for the fades.
  it.each([
    ['15', 4, 0.5, 0, -6, -6.021],
    ['16', 4, 0.5, 45, -6, -5.976],
    ['17', 6, 0.5, 60, -6, -6.316],
    ['18', 8, 0.5, 67.5, -6, -6.028],
    ['19', 4, 1.41, 45, 3, 3.029],
  ])('reads EBU case %s', (_case, perCycle, amplitude, phaseDeg, expectedDbtp, filterDb) => {
    const read = truePeak(tone({ perCycle, amplitude, phaseDeg }));
    expect(read).toBeLessThan(expectedDbtp + 0.2);
    expect(read).toBeGreaterThan(expectedDbtp - 0.4);
    expect(Math.abs(read - filterDb)).toBeLessThan(0.005);
  });

  // Cases 20–23: one period of fs/4 at full scale amid fs/6 at half, made at 4·fs, low-passed, taken at each offset.
  it.each([
    ['20', 0, -0.129],
    ['21', 1, -0.074],
    ['22', 2, -0.181],
    ['23', 3, -0.074],
  ])('reads EBU case %s', (_case, offset, aboutDb) => {
    const read = truePeak(burst(offset));
    expect(read).toBeLessThan(0.2);
    expect(read).toBeGreaterThan(-0.4);
    // The low pass is our own, so a few hundredths lie between.
    expect(Math.abs(read - aboutDb)).toBeLessThan(0.05);
  });

  it('is never below the sample peak, though the filter reads an impulse 0.25 dB low', () => {
    const impulse = new Float32Array(100);
    impulse[50] = -1;
    expect(truePeak(impulse)).toBe(0);
  });

  it('is the same as interpolating every sample', () => {
    for (const seed of [1, 2, 3]) {
      const noise = seededNoise({ length: 3000, rms: 0.2, seed });
      const decaying = noise.map((x, i) => x * Math.exp(-(i % 700) / 90));
      // Both add the same products in another order.
      expect(truePeak(decaying)).toBeCloseTo(interpolatedPeakDb(decaying), 9);
    }
  });

  it('rings on after the last sample', () => {
    const cut = tone({ perCycle: 4, amplitude: 1, phaseDeg: 45 }).subarray(0, 12000);
    expect(truePeak(cut.slice(11990))).toBeCloseTo(interpolatedPeakDb(cut.slice(11990)), 9);
    expect(truePeak(Float32Array.of(0.7, 0.7))).toBeCloseTo(interpolatedPeakDb(Float32Array.of(0.7, 0.7)), 9);
  });

  it('does not depend on how the file is cut, nor on polarity or shift', () => {
    const noise = seededNoise({ length: 20000, rms: 0.1, seed: 9 });
    const whole = truePeak(noise);
    for (const size of [1, 7, 777, 4096]) expect(truePeak(noise, { size })).toBe(whole);
    expect(truePeak(noise.map((x) => -x))).toBe(whole);
    expect(truePeak(Float32Array.from([...new Float32Array(1001), ...noise]))).toBe(whole);
    expect(whole - truePeak(noise.map((x) => x / 2))).toBeCloseTo(6.0206, 4);
  });

  it('interpolates twice from 96 kHz and not from 192 kHz on', () => {
    const between = tone({ perCycle: 4, amplitude: 0.5, phaseDeg: 45 });
    // Samples lie at 0.3536 of the tone: −9.03 dBFS.
    expect(truePeak(between, { rateHz: 192000 })).toBeCloseTo(-9.031, 2);
    // BS.1770-5 Annex 2: 2 times reads at most 3.01 dB low at half the rate, 0.69 dB at a quarter of it; here rather less.
    expect(Math.abs(truePeak(between, { rateHz: 96000 }) + 6.02)).toBeLessThan(0.69);
    expect(truePeak(between, { rateHz: 44100 })).toBe(truePeak(between));
  });

  it('has no level for silence, and none for nothing', () => {
    expect(createTruePeak({ sampleRateHz }).result()).toEqual({ truePeakDbtp: null });
    expect(truePeak(new Float32Array(100))).toBeNaN();
    expect(() => createTruePeak({ sampleRateHz: 0 })).toThrow('sampleRateHz must be a finite number');
  });

  it('leaves its input as it was', () => {
    const samples = seededNoise({ length: 500, rms: 0.3, seed: 2 });
    const before = [...samples];
    truePeak(samples);
    expect([...samples]).toEqual(before);
  });
});

function burst(offset: number): Float32Array {
  const side = 24 * 40;
  const part = (length: number, perCycle: number, amplitude: number): number[] =>
    Array.from({ length }, (_, i) => amplitude * Math.sin((2 * Math.PI * i) / perCycle));
  const made = [...part(side, 24, 0.5), ...part(16, 16, 1), ...part(side, 24, 0.5)];
  const fade = 100;
  const faded = made.map((x, i) => x * Math.min(1, i / fade, (made.length - 1 - i) / fade));
  // A windowed sinc (Hamming), −6 dB at 24 kHz: as firwin(2049, 24000, fs=192000) of SciPy.
  const half = 1024;
  const taps = Array.from({ length: 2 * half + 1 }, (_, n) => {
    const at = (n - half) / 4;
    const sinc = at === 0 ? 1 : Math.sin(Math.PI * at) / (Math.PI * at);
    return 0.25 * sinc * (0.54 - 0.46 * Math.cos((Math.PI * n) / half));
  });
  return Float32Array.from({ length: Math.floor((faded.length - offset) / 4) }, (_, i) => {
    const centre = 4 * i + offset;
    return taps.reduce((sum, tap, n) => sum + tap * (faded[centre + half - n] ?? 0), 0);
  });
}
