import { amplitudeDb } from '../../decibel';
import type { ClipRun, TrackFacts } from '../../facts';
import { createSpanCutter, largestOfSpan, type Spans } from '../spans';

export interface Clipping {
  push(block: Float32Array, spans?: Spans): void;
  result(): TrackFacts['clipping'];
}

/** A run is at least this long; one or two samples at full scale may be chance (docs/measurements.md, 2). */
const shortestRun = 3;
/** "At full scale" for integers: within this many quantisation steps of ±1 (same source). */
const stepsFromFullScale = 2;
/** "At full scale" for float files (same source). */
const floatFullScale = 0.9999;
/** As far above 1 as `floatFullScale` is below. What goes beyond is an over, which a float file keeps unharmed. */
const floatOver = 1.0001;
/** Two samples beyond full scale are one flat top when they differ by no more than float32 rounding, 2^-22. */
const floatRounding = 2 ** -22;
/** Runs that are kept; all of them are counted (packages/contracts, `trackReport`). */
export const runsKept = 200;

/** @returns the size from which a sample of the file counts as at full scale */
export function fullScaleOf(quantisationStep: number | null): number {
  return quantisationStep === null ? floatFullScale : 1 - stepsFromFullScale * quantisationStep;
}

/**
 * Where a track stood still at full scale: runs of three or more successive samples of one sign.
 *
 * Integer files: within 2 quantisation steps of ±1. Float files: from 0.9999 on; beyond 1.0001 only where the top is flat,
 * since a float file holds louder samples without harm.
 *
 * @param options.quantisationStep - of the file (2^-15 for 16-bit); null for float
 */
export function createClipping(options: { readonly quantisationStep: number | null }): Clipping {
  const { quantisationStep } = options;
  const isFloat = quantisationStep === null;
  const threshold = fullScaleOf(quantisationStep);
  const alone = createSpanCutter([]);
  const runs: ClipRun[] = [];
  let closed = { runCount: 0, clippedSamples: 0 };
  let run = { start: 0, length: 0, isPositive: true, largest: 0, last: 0 };
  let position = 0;

  const closeRun = () => {
    if (run.length >= shortestRun) {
      if (runs.length < runsKept) runs.push(clipRun(run));
      closed = { runCount: closed.runCount + 1, clippedSamples: closed.clippedSamples + run.length };
    }
    run.length = 0;
  };
  const addToRun = (sample: number, at: number) => {
    const size = Math.abs(sample);
    const isPositive = sample > 0;
    const continues =
      run.length > 0 && run.isPositive === isPositive && (!isFloat || isOneTop(run.last, size));
    if (!continues) {
      closeRun();
      run = { start: at, length: 0, isPositive, largest: 0, last: 0 };
    }
    run.length += 1;
    run.last = size;
    run.largest = Math.max(run.largest, size);
  };

  return {
    push(block, spans = alone.cut(block)) {
      for (let span = 0, from = 0; span < spans.count; from = spans.ends[span], span += 1) {
        if (largestOfSpan(spans, span) < threshold) {
          closeRun();
          continue;
        }
        for (let i = from; i < spans.ends[span]; i++) {
          const sample = block[i];
          if (sample >= threshold || sample <= -threshold) addToRun(sample, position + i);
          else if (run.length > 0) closeRun();
        }
      }
      position += block.length;
    },
    result() {
      const isOpen = run.length >= shortestRun;
      return {
        runs: isOpen && runs.length < runsKept ? [...runs, clipRun(run)] : [...runs],
        runCount: closed.runCount + (isOpen ? 1 : 0),
        clippedSamples: closed.clippedSamples + (isOpen ? run.length : 0),
      };
    },
  };
}

function isOneTop(previous: number, size: number): boolean {
  if (previous <= floatOver && size <= floatOver) return true;
  return Math.abs(previous - size) <= floatRounding * size;
}

function clipRun(run: { start: number; length: number; largest: number }): ClipRun {
  return { startSample: run.start, lengthSamples: run.length, levelDbfs: amplitudeDb(run.largest) ?? 0 };
}
