import { assertPositive } from '../../assert';
import { amplitudeDb } from '../../decibel';
import { createSpanCutter, largestOfSpan, type Spans } from '../spans';
import { truePeakPhases, truePeakTaps } from './truePeakFilter';

export interface TruePeak {
  push(block: Float32Array, spans?: Spans): void;
  result(): { readonly truePeakDbtp: number | null };
}

/** From these rates on a take is interpolated 2 times, and not at all (BS.1770-5 Annex 2; docs/measurements.md, 2). */
const twofoldFromHz = 96_000;
const singleFromHz = 192_000;
/** Samples that are looked at together within a span; short enough that one hit doesn't drag its decay along. Our choice, for speed. */
const stretchLength = 32;
const historyLength = truePeakTaps - 1;
/** Keeps the bound a bound after rounding. */
const roundingSlack = 1 + 1e-9;

/**
 * True peak of one microphone's whole file: the larger of its interpolated and its sample peak.
 *
 * The filter of BS.1770-5 reads an isolated sample 0.25 dB low, hence the sample peak beside it. A stretch is interpolated
 * only where it can still raise the result: no output exceeds the largest sample times the filter's sum of absolute taps.
 * The outcome is the same as interpolating everything. Before and after the file lies silence.
 *
 * @param options.sampleRateHz - > 0; below 96 kHz 4 times, below 192 kHz 2 times (every other phase), above as it is
 * @returns a meter; dBTP, null for digital silence
 * @throws {SignalError} `option`
 * @see ITU-R BS.1770-5 (11/2023), Annex 2
 * @example
 * const truePeak = createTruePeak({ sampleRateHz: 48000 });
 * truePeak.push(Float32Array.from({ length: 4800 }, (_, n) => Math.sin((Math.PI / 2) * n + Math.PI / 4)));
 * truePeak.result().truePeakDbtp // 0.083
 */
export function createTruePeak(options: { readonly sampleRateHz: number }): TruePeak {
  assertPositive(options.sampleRateHz, 'sampleRateHz');
  const phases = phasesAt(options.sampleRateHz);
  const mostGain = largestGain(phases) * roundingSlack;
  // The last samples of the block before stand in front of the block, so that one loop sees them all.
  let joined = new Float32Array(historyLength);
  const alone = createSpanCutter([]);
  let peak = 0;
  let before = 0;

  return {
    push(block, spans = alone.cut(block)) {
      const length = historyLength + block.length;
      if (joined.length < length) {
        const longer = new Float32Array(length);
        longer.set(joined.subarray(0, historyLength));
        joined = longer;
      }
      joined.set(block, historyLength);
      const samples = joined.subarray(0, length);
      // Locals: a number that a closure keeps is written to the heap each time.
      let [most, last] = [peak, before];
      for (let span = 0, from = 0; span < spans.count; from = spans.ends[span], span += 1) {
        const here = largestOfSpan(spans, span);
        most = Math.max(most, here);
        const to = spans.ends[span];
        if (Math.max(last, here) * mostGain > most) {
          const stretch = { start: historyLength + from, end: historyLength + to };
          most = largestOf(samples, stretch, { phases, mostGain, atLeast: most });
        }
        // A short span doesn't hold all the filter remembers.
        last = to - from < historyLength ? Math.max(last, here) : here;
      }
      peak = most;
      before = last;
      joined.copyWithin(0, length - historyLength, length);
    },
    result() {
      // The filter rings on after the last sample.
      const tail = new Float32Array(2 * historyLength);
      tail.set(joined.subarray(0, historyLength));
      const stretch = { start: historyLength, end: tail.length };
      const largest = largestOf(tail, stretch, { phases, mostGain, atLeast: peak });
      return { truePeakDbtp: amplitudeDb(largest) };
    },
  };
}

function phasesAt(sampleRateHz: number): readonly Float64Array[] {
  if (sampleRateHz >= singleFromHz) return [];
  const every = sampleRateHz >= twofoldFromHz ? 2 : 1;
  return truePeakPhases.filter((_, phase) => phase % every === 0).map((taps) => Float64Array.from(taps));
}

function largestGain(phases: readonly Float64Array[]): number {
  return Math.max(0, ...phases.map((taps) => taps.reduce((sum, tap) => sum + Math.abs(tap), 0)));
}

/** @param samples - at least `historyLength` of them before `start` */
function largestOf(
  samples: Float32Array,
  { start: first, end: last }: { start: number; end: number },
  options: { phases: readonly Float64Array[]; mostGain: number; atLeast: number },
): number {
  const { phases, mostGain } = options;
  let peak = options.atLeast;
  let before = largestSample(samples, first - historyLength, first);
  for (let start = first; start < last; start += stretchLength) {
    const end = Math.min(last, start + stretchLength);
    const here = largestSample(samples, start, end);
    if (Math.max(before, here) * mostGain > peak) {
      for (const taps of phases) peak = Math.max(peak, largestOutput(samples, { taps, start, end }));
    }
    // A last stretch may be short, but nothing comes after it.
    before = here;
  }
  return peak;
}

function largestSample(samples: Float32Array, start: number, end: number): number {
  let largest = 0;
  for (let i = start; i < end; i += 1) {
    const size = Math.abs(samples[i]);
    if (size > largest) largest = size;
  }
  return largest;
}

function largestOutput(
  samples: Float32Array,
  { taps, start, end }: { taps: Float64Array; start: number; end: number },
): number {
  let largest = 0;
  for (let i = start; i < end; i += 1) {
    let output = 0;
    for (let k = 0; k < truePeakTaps; k += 1) output += taps[k] * samples[i - k];
    const size = Math.abs(output);
    if (size > largest) largest = size;
  }
  return largest;
}
