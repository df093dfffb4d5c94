import { randomNumbers } from '../../testing/randomNumbers';
import { createInverseReal } from './inverseReal';
import { lowSpectrum } from './lowSpectrum';
import { createRealTransform, powerOfTwoFrom } from './realSpectrum';

describe('the transform of a real signal', () => {
  const size = 64;
  const transform = createRealTransform(size);

  it('is 1 everywhere for a unit impulse', () => {
    const { re, im } = transform.spectrum(Float64Array.of(1));
    expect(re).toHaveLength(33);
    expect([...re].every((value) => Math.abs(value - 1) < 1e-12)).toBe(true);
    expect([...im].every((value) => Math.abs(value) < 1e-12)).toBe(true);
  });

  it('turns by −2πkD/N when the impulse is delayed by D', () => {
    const { re, im } = transform.spectrum(Float64Array.of(0, 0, 0, 1));
    expect(Math.atan2(im[5], re[5])).toBeCloseTo((-2 * Math.PI * 5 * 3) / size, 9);
  });

  it('has A·N/2 in the bin of a cosine of amplitude A', () => {
    const cosine = Float64Array.from(
      { length: size },
      (_, i) => 0.5 * Math.cos((2 * Math.PI * 4 * i) / size),
    );
    expect(transform.spectrum(cosine).re[4]).toBeCloseTo(0.5 * 32, 9);
  });

  it('comes back, also between the samples', () => {
    const tone = (i: number): number => Math.cos((2 * Math.PI * 3 * i) / size + 0.4) + 0.2;
    const samples = Float64Array.from({ length: size }, (_, i) => tone(i));
    const { re, im } = transform.spectrum(samples);
    const spectrum = { re: re.subarray(0, 20), im: im.subarray(0, 20) };
    createInverseReal(size)(spectrum).forEach((value, i) => expect(value).toBeCloseTo(tone(i), 9));
    // Twice as fine: 1/N of the larger size halves the level.
    createInverseReal(2 * size)(spectrum).forEach((value, i) =>
      expect(2 * value).toBeCloseTo(tone(i / 2), 9),
    );
  });

  it('is the same in its lowest bins by short transforms, of a signal of any length', () => {
    const random = randomNumbers(11);
    for (const [length, size] of [
      [30_000, 32_768],
      [32_768, 32_768],
      [500, 1024],
    ]) {
      const samples = Float64Array.from({ length }, random);
      const whole = createRealTransform(size).spectrum(samples);
      const { re, im } = lowSpectrum(samples, { size, binCount: 300 });
      expect(re).toHaveLength(300);
      // Sums of 32,768 numbers below 1.
      re.forEach((value, k) => expect(Math.abs(value - whole.re[k])).toBeLessThan(1e-9));
      im.forEach((value, k) => expect(Math.abs(value - whole.im[k])).toBeLessThan(1e-9));
    }
  });

  it('rounds lengths up to powers of two', () => {
    expect([1, 2, 3, 4096, 4097].map(powerOfTwoFrom)).toEqual([2, 2, 4, 4096, 8192]);
  });
});
