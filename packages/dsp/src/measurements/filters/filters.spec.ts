import { butterworthBand, butterworthHighPass, butterworthLowPass } from './butterworth';
import { createFilterChain, filtered } from './filterChain';
import { lowPass } from './lowPass';

const sampleRateHz = 48000;
const sine = (hz: number, seconds = 1): Float32Array =>
  Float32Array.from({ length: sampleRateHz * seconds }, (_, i) =>
    Math.sin((2 * Math.PI * hz * i) / sampleRateHz),
  );
const rms = (x: ArrayLike<number>, from: number): number => {
  let sum = 0;
  for (let i = from; i < x.length; i += 1) sum += x[i] ** 2;
  return Math.sqrt(sum / (x.length - from));
};
/** Gain of a steady tone, after the first half second has settled. */
const gainDb = (hz: number, run: (x: Float32Array) => ArrayLike<number>): number =>
  20 * Math.log10(rms(run(sine(hz)), 24000) / rms(sine(hz), 24000));

describe('Butterworth sections', () => {
  // Closed form of a second-order Butterworth: |H|² = 1/(1 + (f/fc)⁴). 0.02 dB: the tone's last period is cut.
  it('lose half the power at the cutoff', () => {
    const low = [butterworthLowPass({ sampleRateHz, cutoffHz: 200 })];
    const high = [butterworthHighPass({ sampleRateHz, cutoffHz: 200 })];
    expect(gainDb(200, (x) => filtered(x, low))).toBeCloseTo(-3.01, 1);
    expect(gainDb(200, (x) => filtered(x, high))).toBeCloseTo(-3.01, 1);
  });

  it('fall by 12 dB an octave outside', () => {
    const high = [butterworthHighPass({ sampleRateHz, cutoffHz: 800 })];
    expect(gainDb(100, (x) => filtered(x, high))).toBeCloseTo(-10 * Math.log10(1 + 8 ** 4), 1);
  });

  it('make a band that leaves its middle alone', () => {
    const band = butterworthBand({ sampleRateHz, lowHz: 30, highHz: 3000 });
    expect(Math.abs(gainDb(300, (x) => filtered(x, band)))).toBeLessThan(0.02);
  });

  it('stay finite with a cutoff above half the rate', () => {
    const low = butterworthLowPass({ sampleRateHz: 8000, cutoffHz: 5000 });
    expect(Object.values(low).every(Number.isFinite)).toBe(true);
  });
});

describe('a filter chain', () => {
  it('does not mind how the signal is cut into blocks', () => {
    const band = butterworthBand({ sampleRateHz, lowHz: 30, highHz: 150 });
    const samples = sine(60);
    const whole = filtered(samples, band);
    const chain = createFilterChain(band);
    const parts = new Float64Array(samples.length);
    for (let start = 0; start < samples.length; start += 777) {
      const block = samples.subarray(start, start + 777);
      chain.process(block, parts.subarray(start, start + block.length));
    }
    expect(parts).toEqual(whole);
  });

  it('leaves the input unchanged', () => {
    const samples = sine(60);
    filtered(samples, butterworthBand({ sampleRateHz, lowHz: 30, highHz: 150 }));
    expect(samples).toEqual(sine(60));
  });
});

describe('the low pass of the pair trace', () => {
  it('does not move a low tone in time', () => {
    const tone = sine(40);
    const low = lowPass(tone, { sampleRateHz, cutoffHz: 400 });
    // Both directions: |H|² = 1/(1 + 10⁻⁴), −0.0004 dB; away from the ends nothing else differs.
    for (let i = 12000; i < 36000; i += 100) expect(low[i]).toBeCloseTo(tone[i], 3);
  });

  it('loses 6 dB at the cutoff', () => {
    const middle = (x: Float32Array) => lowPass(x, { sampleRateHz, cutoffHz: 150 }).subarray(0, 40000);
    expect(gainDb(150, middle)).toBeCloseTo(-6.02, 1);
  });

  it('takes a single sample and none', () => {
    expect(lowPass(Float32Array.of(0.5), { sampleRateHz, cutoffHz: 150 })).toHaveLength(1);
    expect(lowPass(new Float32Array(0), { sampleRateHz, cutoffHz: 150 })).toHaveLength(0);
  });
});
