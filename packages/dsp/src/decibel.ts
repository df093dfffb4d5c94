/**
 * Level of an amplitude, 20·lg|x|: dBFS (peak-referenced) for a full scale of 1.
 *
 * @param amplitude - linear, any sign
 * @returns dB; null for 0, whose level is no finite number
 * @example
 * amplitudeDb(0.5) // -6.021
 */
export function amplitudeDb(amplitude: number): number | null {
  return amplitude === 0 ? null : 20 * Math.log10(Math.abs(amplitude));
}

/**
 * Level of a power or an energy, 10·lg(p).
 *
 * @param power - linear, >= 0
 * @returns dB; null for 0, whose level is no finite number
 * @example
 * powerDb(0.5) // -3.01
 */
export function powerDb(power: number): number | null {
  return power > 0 ? 10 * Math.log10(power) : null;
}

/**
 * @returns the linear amplitude of a level in dB, 10^(dB/20)
 * @example
 * dbAmplitude(-6) // 0.501
 */
export function dbAmplitude(levelDb: number): number {
  return Math.pow(10, levelDb / 20);
}

/**
 * @returns the linear power of a level in dB, 10^(dB/10)
 * @example
 * dbPower(3) // 1.995
 */
export function dbPower(levelDb: number): number {
  return Math.pow(10, levelDb / 10);
}
