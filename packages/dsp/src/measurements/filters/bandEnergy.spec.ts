import { kWeighting } from '../loudness/kWeighting';
import { randomNumbers } from '../../testing/randomNumbers';
import { createBandEnergy, createButterworthEnergy, type BandEnergy } from './bandEnergy';
import { butterworthBand } from './butterworth';
import { filtered } from './filterChain';

const random = randomNumbers(3);
const noise = Float32Array.from({ length: 20_000 }, () => random() - 0.5);

/** The largest relative difference between the energies of stretches and those of the plain filter's output. */
function offFrom(plain: Float64Array, fast: BandEnergy): number {
  let most = 0;
  for (let from = 0; from < noise.length; from += 96) {
    const to = Math.min(noise.length, from + 96);
    const expected = plain.subarray(from, to).reduce((sum, x) => sum + x * x, 0);
    most = Math.max(most, Math.abs(fast.next(noise, from, to) / expected - 1));
  }
  return most;
}

// Doubles carry 1e-16; poles near zero frequency lift what they round by a million at 192 kHz. Still below 1e-7 dB.
const rounding = 1e-8;

describe('the energy of a filtered signal', () => {
  it.each([
    [44_100, 30, 150],
    [48_000, 100, 1000],
    [48_000, 5000, 15_000],
    [192_000, 30, 150],
    [8000, 5000, 15_000],
  ])('at %i Hz from %i to %i Hz is that of the plain filter', (sampleRateHz, lowHz, highHz) => {
    const band = { sampleRateHz, lowHz, highHz };
    const plain = filtered(noise, butterworthBand(band));
    expect(offFrom(plain, createButterworthEnergy(band))).toBeLessThan(rounding);
    expect(offFrom(plain, createBandEnergy(butterworthBand(band)))).toBeLessThan(rounding);
  });

  it.each([8000, 48_000, 192_000])(
    'with K-weighting at %i Hz is that of the plain filter',
    (sampleRateHz) => {
      const plain = filtered(noise, kWeighting(sampleRateHz));
      expect(offFrom(plain, createBandEnergy(kWeighting(sampleRateHz)))).toBeLessThan(rounding);
    },
  );
});
