import { assertBetween } from '../assert';

/** Speed at 0 °C and the kelvins that make up 0 °C: the ideal-gas form, 343.2 m/s at 20 °C as in ISO 9613-1. */
const SPEED_AT_0_M_PER_S = 331.3;
const ZERO_C_IN_K = 273.15;

/**
 * Speed of sound in dry air, 331.3·√(1 + t/273.15).
 *
 * @param temperatureC - −60 … 60
 * @returns m/s
 * @throws {SignalError} `option`
 * @example
 * speedOfSoundMPerS(20) // 343.215
 */
export function speedOfSoundMPerS(temperatureC: number): number {
  assertBetween(temperatureC, -60, 60, 'temperatureC');
  return SPEED_AT_0_M_PER_S * Math.sqrt(1 + temperatureC / ZERO_C_IN_K);
}

/**
 * How much further away the later microphone is: about, since an arrival holds to some tenths of a millisecond.
 * @example
 * pathDifferenceM(2.6, 20) // 0.892
 */
export function pathDifferenceM(arrivalMs: number, temperatureC: number): number {
  return (arrivalMs / 1000) * speedOfSoundMPerS(temperatureC);
}
