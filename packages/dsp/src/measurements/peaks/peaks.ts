import { SignalError } from '../../assert';
import { createSpanCutter, type Border, type Spans } from '../spans';

/** The outline of one track at one resolution. */
export interface PeakLevel {
  /** A step k of a take of F frames holds the frames ⌊k·F/steps⌋ to ⌊(k + 1)·F/steps⌋, end not included. */
  readonly steps: number;
  /** For each step the lowest and the highest sample; −127 … 127 is full scale. */
  readonly pairs: Int8Array;
}

/** The outline of one track at several resolutions, coarsest first. */
export type TrackPeaks = readonly PeakLevel[];

export interface PeaksMeter {
  /** @param spans - cut at the steps' ends, see {@link peakBorder} */
  push(block: Float32Array, spans?: Spans): void;
  /** Steps that no sample reached are silent. */
  result(): TrackPeaks;
}

export interface PeaksOptions {
  /** How many samples will be pushed; more are not looked at. */
  readonly frames: number;
  /** Each divides the next. */
  readonly stepsPerLevel?: readonly number[];
}

/** A phone's width twice over, a wide screen's, and one to zoom into; common practice, no source. */
export const peakSteps: readonly number[] = [500, 2000, 8000];
export const PEAK_FULL_SCALE = 127;

/** @returns where the steps of {@link createPeaks} end */
export function peakBorder(options: PeaksOptions): Border {
  const { frames } = options;
  const finest = wantedSteps(options).at(-1) ?? 1;
  const endOf = (step: number): number => Math.floor(((step + 1) * frames) / finest);
  return (at) => {
    if (at >= frames) return Infinity;
    let step = Math.floor((at * finest) / frames);
    while (endOf(step) <= at) step += 1;
    return endOf(step);
  };
}

/**
 * Gathers the outline of a track in one pass, for the picture of the whole take.
 *
 * Only the finest level is gathered; the coarser ones are made of it, which gives the same since their steps begin where
 * finer ones do. A take of fewer frames than steps has a frame a step, at one level only.
 *
 * @throws {SignalError} `option` for steps that don't divide each other
 * @example
 * const peaks = createPeaks({ frames: 4, stepsPerLevel: [2] });
 * peaks.push(Float32Array.of(0, 1, -1, 0.5));
 * Array.from(peaks.result()[0].pairs) // [0, 127, -127, 64]
 */
export function createPeaks(options: PeaksOptions): PeaksMeter {
  const { frames } = options;
  const levels = wantedSteps(options);
  const alone = createSpanCutter([peakBorder(options)]);
  const finest = levels[levels.length - 1];
  const lows = new Float32Array(finest);
  const highs = new Float32Array(finest);
  let step = 0;
  let taken = 0;
  let stepStart = 0;
  let stepEnd = Math.floor(frames / finest);
  return {
    push(block, spans = alone.cut(block)) {
      for (let span = 0, from = 0; span < spans.count && step < finest; span += 1) {
        const isFirst = taken === stepStart;
        lows[step] = isFirst ? spans.lows[span] : Math.min(lows[step], spans.lows[span]);
        highs[step] = isFirst ? spans.highs[span] : Math.max(highs[step], spans.highs[span]);
        taken += spans.ends[span] - from;
        from = spans.ends[span];
        if (taken === stepEnd) {
          step += 1;
          stepStart = taken;
          stepEnd = Math.floor(((step + 1) * frames) / finest);
        }
      }
    },
    result: () => levels.map((steps) => ({ steps, pairs: merged(lows, highs, steps) })),
  };
}

function wantedSteps({ frames, stepsPerLevel = peakSteps }: PeaksOptions): readonly number[] {
  const wanted = checked(stepsPerLevel).filter((steps) => steps <= frames);
  return wanted.length > 0 ? wanted : [Math.max(1, Math.floor(frames))];
}

function checked(stepsPerLevel: readonly number[]): readonly number[] {
  const fine = stepsPerLevel.every(
    (steps, i) => Number.isInteger(steps) && steps > 0 && (i === 0 || steps % stepsPerLevel[i - 1] === 0),
  );
  if (!fine || stepsPerLevel.length === 0) {
    throw new SignalError('option', 'Each number of steps is whole and divides the next.');
  }
  return stepsPerLevel;
}

function merged(lows: Float32Array, highs: Float32Array, steps: number): Int8Array {
  const each = lows.length / steps;
  const pairs = new Int8Array(2 * steps);
  for (let k = 0; k < steps; k += 1) {
    let [low, high] = [Infinity, -Infinity];
    for (let i = k * each; i < (k + 1) * each; i += 1) {
      if (lows[i] < low) low = lows[i];
      if (highs[i] > high) high = highs[i];
    }
    pairs[2 * k] = rounded(low);
    pairs[2 * k + 1] = rounded(high);
  }
  return pairs;
}

/** Float files may go beyond full scale; the outline stops there. */
function rounded(sample: number): number {
  return Math.max(-PEAK_FULL_SCALE, Math.min(PEAK_FULL_SCALE, Math.round(PEAK_FULL_SCALE * sample)));
}
