import { randomNumbers } from '../testing/randomNumbers';
import { createComplexTransform, createKernelTransform, createPlainTransform } from './complexTransform';

const transformed = (transform: ReturnType<typeof createKernelTransform>, seed = 4): Float64Array => {
  if (!transform) throw new Error('There is no WebAssembly here.');
  const random = randomNumbers(seed);
  for (let i = 0; i < transform.input.length; i += 1) transform.input[i] = random();
  return transform.transform().slice();
};

describe('the kernel of transforms', () => {
  it.each([2, 4, 8, 16, 32, 512, 2048, 8192])('says of %i points what fft.js says', (size) => {
    const kernel = transformed(createKernelTransform(size));
    const plain = transformed(createPlainTransform(size));
    // Rounding grows with the logarithm of the size; numbers are sums of as many below 1.
    kernel.forEach((value, i) => expect(Math.abs(value - plain[i])).toBeLessThan(1e-15 * 16 * size));
  });

  it('may be used again and again', () => {
    const transform = createKernelTransform(128);
    const first = transformed(transform, 1);
    expect(transformed(transform, 2)).not.toEqual(first);
    expect(transformed(transform, 1)).toEqual(first);
  });

  it('is what is used here', () => {
    expect(transformed(createComplexTransform(64))).toEqual(transformed(createKernelTransform(64)));
  });
});
