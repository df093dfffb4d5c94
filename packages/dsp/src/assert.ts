/** Why a signal or an option was refused; for programs. */
export type SignalErrorCode = 'empty' | 'not-finite' | 'option' | 'length';

/** A caller handed over something no figure can be computed from: a mistake in the program, not in the take. */
export class SignalError extends Error {
  override readonly name = 'SignalError';

  constructor(
    readonly code: SignalErrorCode,
    message: string,
  ) {
    super(message);
  }
}

/**
 * Refuses an empty signal and one that holds NaN or an infinity.
 *
 * @throws {SignalError} `empty` or `not-finite`
 * @example
 * assertSamples(Float32Array.of(0, 0.5)) // undefined
 */
export function assertSamples(samples: Float32Array | Float64Array, name = 'samples'): void {
  if (samples.length === 0) throw new SignalError('empty', `${name} hold no sample.`);
  assertFiniteSamples(samples, name);
}

/**
 * Refuses a signal that holds NaN or an infinity; an empty one passes.
 *
 * @throws {SignalError} `not-finite`
 * @example
 * assertFiniteSamples(new Float32Array(0)) // undefined
 */
export function assertFiniteSamples(samples: Float32Array | Float64Array, name = 'samples'): void {
  // x − x is 0 for every finite x and NaN otherwise, so one sum tells of all samples at once.
  let sum = 0;
  for (let i = 0; i < samples.length; i++) sum += samples[i] - samples[i];
  if (sum !== 0) throw new SignalError('not-finite', `${name} hold a value that is not a finite number.`);
}

/**
 * Refuses an option that is not a finite number above zero.
 *
 * @throws {SignalError} `option`
 * @example
 * assertPositive(48000, 'sampleRateHz') // undefined
 */
export function assertPositive(value: number, name: string): void {
  if (!(Number.isFinite(value) && value > 0)) {
    throw new SignalError('option', `${name} must be a finite number above 0, not ${value}.`);
  }
}

/**
 * Refuses an option outside its range; both ends belong to the range.
 *
 * @throws {SignalError} `option`
 * @example
 * assertBetween(20, -60, 60, 'temperatureC') // undefined
 */
export function assertBetween(value: number, low: number, high: number, name: string): void {
  if (!(value >= low && value <= high)) {
    throw new SignalError('option', `${name} must lie between ${low} and ${high}, not ${value}.`);
  }
}
