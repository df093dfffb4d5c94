import { assertFiniteSamples, SignalError } from '../../assert';

/**
 * A sinc under a Kaiser window this wide to each side, with this β (8.96 for 90 dB: Kaiser & Schafer 1980). A test holds
 * it to a thousandth of full scale up to 20 kHz at 48 kHz.
 */
const HALF_WIDTH = 32;
const KAISER_BETA = 8.96;

/** How many samples to each side a shifted sample is made from: what a stretch must hold more to be shifted like the whole. */
export const shiftReachSamples = HALF_WIDTH;

/**
 * The same sound played `shiftSamples` earlier (later where negative), by any part of a sample.
 *
 * Whole samples move exactly; parts of one by band-limited interpolation. Beyond its ends the track is silent.
 *
 * @param samples - mono, finite
 * @param shiftSamples - finite
 * @returns as many samples: y[n] = x(n + shift)
 * @throws {SignalError} `not-finite`, `option`
 * @example
 * Array.from(shiftedSamples(Float32Array.of(0, 0, 1, 0), 1)) // [0, 1, 0, 0]
 */
export function shiftedSamples(samples: Float32Array, shiftSamples: number): Float32Array {
  assertFiniteSamples(samples);
  if (!Number.isFinite(shiftSamples)) throw new SignalError('option', 'A shift is a finite number.');
  const whole = Math.floor(shiftSamples);
  const part = shiftSamples - whole;
  const out = new Float32Array(samples.length);
  if (part === 0) {
    for (let n = 0; n < out.length; n += 1) out[n] = samples[n + whole] ?? 0;
    return out;
  }
  const taps = fractionTaps(part);
  for (let n = 0; n < out.length; n += 1) {
    const first = n + whole - HALF_WIDTH + 1;
    const from = Math.max(0, -first);
    const to = Math.min(taps.length, samples.length - first);
    let sum = 0;
    for (let k = from; k < to; k += 1) sum += taps[k] * samples[first + k];
    out[n] = sum;
  }
  return out;
}

/** Weights of the samples around a place `part` behind the middle one; they add up to 1, so that DC stays as it is. */
function fractionTaps(part: number): Float64Array {
  const taps = new Float64Array(2 * HALF_WIDTH);
  let sum = 0;
  for (let k = 0; k < taps.length; k += 1) {
    const away = k - (HALF_WIDTH - 1) - part;
    const inside = Math.max(0, 1 - (away / HALF_WIDTH) ** 2);
    taps[k] = (Math.sin(Math.PI * away) / (Math.PI * away)) * bessel0(KAISER_BETA * Math.sqrt(inside));
    sum += taps[k];
  }
  return taps.map((tap) => tap / sum);
}

/** Modified Bessel function of order 0 by its power series (Abramowitz & Stegun 9.6.12); only ratios are used. */
function bessel0(x: number): number {
  let term = 1;
  let sum = 1;
  for (let k = 1; term > sum * 1e-12; k += 1) {
    term *= (x / (2 * k)) ** 2;
    sum += term;
  }
  return sum;
}
