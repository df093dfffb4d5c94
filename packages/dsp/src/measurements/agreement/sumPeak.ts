import { assertFiniteSamples, assertPositive, SignalError } from '../../assert';
import { amplitudeDb, dbAmplitude } from '../../decibel';
import type { Choice } from '../../facts';
import { shiftedSamples } from './shiftedSamples';

export interface SumPeakOptions {
  readonly sampleRateHz: number;
  readonly choice: Choice;
}

/**
 * Sample peak of the two microphones added with a choice: they may clip together though neither does alone.
 *
 * @param kick - a stretch of the kick microphone, finite
 * @param overhead - the same stretch of the overhead
 * @returns dBFS, above 0 where the two would clip; null for silence
 * @throws {SignalError} `length` for stretches of different lengths; `not-finite`, `option`
 * @example
 * const choice = { flipped: false, shiftMs: 0, gainDb: 0 };
 * sumPeakDbfs(Float32Array.of(0.5), Float32Array.of(0.5), { sampleRateHz: 48000, choice }) // 0
 */
export function sumPeakDbfs(
  kick: Float32Array,
  overhead: Float32Array,
  { sampleRateHz, choice }: SumPeakOptions,
): number | null {
  assertPositive(sampleRateHz, 'sampleRateHz');
  assertFiniteSamples(kick, 'kick');
  if (kick.length !== overhead.length) {
    throw new SignalError('length', 'Two stretches that are added have the same length.');
  }
  const shifted = shiftedSamples(overhead, (choice.shiftMs / 1000) * sampleRateHz);
  const gain = dbAmplitude(choice.gainDb) * (choice.flipped ? -1 : 1);
  let peak = 0;
  for (let i = 0; i < kick.length; i += 1) {
    const size = Math.abs(kick[i] + gain * shifted[i]);
    if (size > peak) peak = size;
  }
  return amplitudeDb(peak);
}
