/** fft.js ships no types; what is used of version 4.0.4. Complex arrays interleave real and imaginary parts. */
declare module 'fft.js' {
  type Numbers = number[] | Float64Array | Float32Array;

  class FFT {
    /** @param size - a power of two, at least 2 */
    constructor(size: number);
    readonly size: number;
    /** A complex array of this size, all zero; its type is plain `Array`. */
    createComplexArray(): number[];
    toComplexArray(input: Numbers, storage?: Numbers): Numbers;
    fromComplexArray(complex: Numbers, storage?: Numbers): Numbers;
    /** Fills the upper half from the lower after `realTransform`. */
    completeSpectrum(spectrum: Numbers): void;
    transform(out: Numbers, data: Numbers): void;
    /** Of `size` real numbers; fills only the lower half of `out`. */
    realTransform(out: Numbers, data: Numbers): void;
    inverseTransform(out: Numbers, data: Numbers): void;
  }

  export = FFT;
}
