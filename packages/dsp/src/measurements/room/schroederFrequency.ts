import { assertPositive } from '../../assert';

/**
 * Where single modes give way to a diffuse field, f = 2000·√(T/V).
 *
 * @param options - reverberation in seconds per 60 dB, > 0; volume > 0
 * @returns Hz; an estimate, the change is gradual
 * @throws {SignalError} `option` for a value that is not above 0
 * @see M. R. Schroeder and K. H. Kuttruff, JASA 34 (1962) (from memory); the same form in COMSOL's acoustics manual
 * @example
 * schroederFrequencyHz({ reverberationS: 0.4, volumeM3: 50 }) // 178.89
 */
export function schroederFrequencyHz({
  reverberationS,
  volumeM3,
}: {
  readonly reverberationS: number;
  readonly volumeM3: number;
}): number {
  assertPositive(reverberationS, 'reverberationS');
  assertPositive(volumeM3, 'volumeM3');
  return 2000 * Math.sqrt(reverberationS / volumeM3);
}
