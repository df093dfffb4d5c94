import { SignalError } from '../../assert';
import { amplitudeDb, powerDb } from '../../decibel';
import type { TrackFacts } from '../../facts';
import { createSpanCutter, largestOfSpan, type Spans } from '../spans';

export type PeakAndPowerFacts = Pick<
  TrackFacts,
  'samplePeakDbfs' | 'samplePeakAtS' | 'headroomDb' | 'rmsDbfs' | 'crestFactorDb' | 'dcOffset'
>;

export interface PeakAndPower {
  push(block: Float32Array, spans?: Spans): void;
  result(): PeakAndPowerFacts;
}

/**
 * Sample peak and where it first is, headroom, plain RMS, crest factor and mean of one microphone's whole file.
 *
 * dBFS is peak-referenced: a full-scale sine has an RMS of −3.01 dBFS. AES17's convention reads 3.01 dB higher
 * (AES17-2015 3.12). Silence has no level: null.
 *
 * @param options.sampleRateHz - > 0
 * @returns a meter; `push` throws {SignalError} `not-finite`
 */
export function createPeakAndPower(options: { readonly sampleRateHz: number }): PeakAndPower {
  const alone = createSpanCutter([]);
  let peak = 0;
  let peakAt = 0;
  let sum = 0;
  let energy = 0;
  let count = 0;

  return {
    push(block, spans = alone.cut(block)) {
      // Locals: a number that a closure keeps is written to the heap each time.
      let [sumHere, energyHere] = [sum, energy];
      for (let span = 0, from = 0; span < spans.count; from = spans.ends[span], span += 1) {
        sumHere += spans.sums[span];
        energyHere += spans.energies[span];
        const largest = largestOfSpan(spans, span);
        if (largest > peak) {
          peak = largest;
          peakAt = count + firstOfSize(block, from, largest);
        }
      }
      sum = sumHere;
      energy = energyHere;
      if (!Number.isFinite(energy)) {
        throw new SignalError('not-finite', 'The track holds a value that is no number.');
      }
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

function firstOfSize(block: Float32Array, from: number, size: number): number {
  let at = from;
  while (at < block.length - 1 && Math.abs(block[at]) !== size) at += 1;
  return at;
}
