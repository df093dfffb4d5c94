import { SignalError } from '../../assert';
import { amplitudeDb, powerDb } from '../../decibel';
import type { TrackFacts } from '../../facts';

export type PeakAndPowerFacts = Pick<
  TrackFacts,
  'samplePeakDbfs' | 'samplePeakAtS' | 'headroomDb' | 'rmsDbfs' | 'crestFactorDb' | 'dcOffset'
>;

export interface PeakAndPower {
  push(block: Float32Array): void;
  result(): PeakAndPowerFacts;
}

/**
 * Sample peak and where it first is, headroom, plain RMS, crest factor and mean of one microphone's whole file.
 *
 * dBFS is peak-referenced: a full-scale sine has an RMS of −3.01 dBFS. AES17's convention reads 3.01 dB higher
 * (check-values.md section 3). Silence has no level: null.
 *
 * @param options.sampleRateHz - > 0
 * @returns a meter; `push` throws {SignalError} `not-finite`
 */
export function createPeakAndPower(options: { readonly sampleRateHz: number }): PeakAndPower {
  let peak = 0;
  let peakAt = 0;
  let sum = 0;
  let energy = 0;
  let count = 0;

  return {
    push(block) {
      // Locals: a number that a closure keeps is written to the heap each time, which costs more than the sum.
      let [blockPeak, blockSum, blockEnergy] = [peak, sum, energy];
      let blockPeakAt = -1;
      for (let i = 0; i < block.length; i++) {
        const sample = block[i];
        const size = Math.abs(sample);
        if (size > blockPeak) {
          blockPeak = size;
          blockPeakAt = i;
        }
        blockSum += sample;
        blockEnergy += sample * sample;
      }
      if (!Number.isFinite(blockEnergy)) {
        throw new SignalError('not-finite', 'The track holds a value that is no number.');
      }
      if (blockPeakAt >= 0) peakAt = count + blockPeakAt;
      [peak, sum, energy] = [blockPeak, blockSum, blockEnergy];
      count += block.length;
    },
    result() {
      const samplePeakDbfs = amplitudeDb(peak);
      const rmsDbfs = count === 0 ? null : powerDb(energy / count);
      return {
        samplePeakDbfs,
        samplePeakAtS: samplePeakDbfs === null ? null : peakAt / options.sampleRateHz,
        headroomDb: samplePeakDbfs === null ? null : 0 - samplePeakDbfs,
        rmsDbfs,
        crestFactorDb: samplePeakDbfs === null || rmsDbfs === null ? null : samplePeakDbfs - rmsDbfs,
        dcOffset: count === 0 ? 0 : sum / count,
      };
    },
  };
}
