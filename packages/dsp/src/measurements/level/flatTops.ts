import { amplitudeDb } from '../../decibel';
import type { ClipRun, TrackFacts } from '../../facts';
import { createSpanCutter, largestOfSpan, type Spans } from '../spans';
import { runsKept } from './clipping';

export interface FlatTops {
  push(block: Float32Array, spans?: Spans): void;
  result(): {
    /** Flat tops below full scale, as clipping; none where there are fewer than two. */
    readonly flat: TrackFacts['clipping'];
    readonly looksFlattened: boolean;
  };
}

export interface FlatTopsOptions {
  readonly sampleRateHz: number;
  readonly quantisationStep: number | null;
  /** From this size on a top is the business of `createClipping`. */
  readonly fullScale: number;
}

/** All of docs/measurements.md, 2: how long, how near the take's own peak, how loud and how often. */
const shortestAt48 = 4;
const nearPeak = 10 ** (-0.1 / 20);
const quietestPeak = 10 ** (-30 / 20);
const fewestFlat = 2;
const likeWithin = 0.004;
const shortestLike = 3;
const steeper = 4;
/** A flattened top is looked for near the peak: quieter ones say nothing of the preamp. Our choice. */
const likeNearPeak = 10 ** (-1 / 20);
/**
 * The round top of a slow wave stands still too once it is quantised, for four samples and more at low frequencies. It is
 * left and entered by at most four steps in all (a parabola that stays within one step over four samples), a cut one by
 * far more. Our choice.
 */
const stepsOfRoundTop = 6;
/** A float file may hold what once was 16-bit. */
const floatStep = 2 ** -15;

/**
 * Spans with nothing near the take's own peak, the two before such a one left out, are passed by: no top can lie in them,
 * and before one it is soon clear where runs begin, since two samples that differ begin one.
 */
const spansBefore = 2;

interface Tops {
  count: number;
  samples: number;
  runs: ClipRun[];
}

/**
 * Tops that stand still below full scale: the input stage, or a limiter, gave out before the converter did.
 *
 * Flat: at least four equal samples (in proportion above 48 kHz) within 0.1 dB of the take's own peak, in two places or
 * more. Looking flattened: at least three samples within 0.4 %, entered and left by steps more than four times those
 * inside, in three places or more within 1 dB of the peak; a round top has steps of three times at most.
 */
export function createFlatTops(options: FlatTopsOptions): FlatTops {
  const shortest = Math.ceil(Math.max(shortestAt48, (shortestAt48 * options.sampleRateHz) / 48_000));
  const step = options.quantisationStep ?? floatStep;
  const flat = new Map<number, Tops>();
  let peak = 0;
  // The open run of equal samples: its value, the sample before it, where it starts, how long it is; 0 where none is open.
  let run = { value: 0, before: 0, start: 0, length: 0 };
  let lastSample = 0;
  const like = createLikeRuns(step);
  const alone = createSpanCutter([]);
  let position = 0;

  const closeRun = (closed: typeof run, after: number): void => {
    const size = Math.abs(closed.value);
    if (size < Math.max(quietestPeak, peak * nearPeak) || size >= options.fullScale) return;
    const sign = Math.sign(closed.value);
    const [rise, fall] = [size - sign * closed.before, size - sign * after];
    if (Math.min(rise, fall) <= 0 || rise + fall <= stepsOfRoundTop * step) return;
    const tops = flat.get(size) ?? { count: 0, samples: 0, runs: [] };
    if (tops.runs.length < runsKept) tops.runs.push(clipRun(closed, size));
    flat.set(size, { ...tops, count: tops.count + 1, samples: tops.samples + closed.length });
  };

  const look = (block: Float32Array, from: number, to: number): void => {
    // Locals: a number that a closure keeps is written to the heap each time.
    let { value, before, start, length } = run;
    let previous = lastSample;
    for (let i = from; i < to; i += 1) {
      const sample = block[i];
      const isLoud = sample >= quietestPeak || sample <= -quietestPeak;
      if (length > 0 && sample !== value) {
        if (length >= shortest) closeRun({ value, before, start, length }, sample);
        length = 0;
        if (!isLoud) like.end(sample);
      }
      if (isLoud) {
        like.see(sample, previous);
        if (length === 0) {
          value = sample;
          before = previous;
          start = position + i;
        }
        length += 1;
      }
      previous = sample;
    }
    run = { value, before, start, length };
    lastSample = previous;
  };
  const passBy = (last: number): void => {
    run.length = 0;
    like.forget();
    lastSample = last;
  };

  return {
    push(block, spans = alone.cut(block)) {
      let most = peak;
      for (let span = 0; span < spans.count; span += 1) most = Math.max(most, largestOfSpan(spans, span));
      peak = most;
      const least = Math.max(quietestPeak, peak * likeNearPeak) * (1 - likeWithin);
      let from = 0;
      for (let span = 0; span < spans.count; span += 1) {
        const to = spans.ends[span];
        if (isWorthALook(spans, span, least)) look(block, from, to);
        else passBy(block[to - 1]);
        from = to;
      }
      position += block.length;
    },
    result: () => ({
      flat: peak < quietestPeak ? noTops : nearThePeak(flat, peak),
      looksFlattened: peak > 0 && like.thirdLargest() >= peak * likeNearPeak,
    }),
  };
}

/** The last spans of a block are always worth it: what comes after them isn't here yet. */
function isWorthALook(spans: Spans, span: number, least: number): boolean {
  for (let ahead = span; ahead <= span + spansBefore; ahead += 1) {
    if (ahead >= spans.count || largestOfSpan(spans, ahead) >= least) return true;
  }
  return false;
}

/** Runs of nearly equal samples that are entered and left steeply; only the three largest are kept. */
function createLikeRuns(step: number) {
  let largest: readonly number[] = [0, 0, 0];
  let length = 0;
  let least = 0;
  let most = 0;
  let last = 0;
  let entered = 0;
  let largestStep = 0;

  const end = (after: number): void => {
    const left = Math.abs(last) - Math.sign(last) * after;
    const enough = steeper * Math.max(largestStep, step);
    const isTop = length >= shortestLike && entered > enough && left > enough;
    if (isTop) largest = [...largest, most].sort((a, b) => b - a).slice(0, 3);
    length = 0;
  };
  return {
    end,
    forget(): void {
      length = 0;
    },
    see(sample: number, previous: number): void {
      const size = Math.abs(sample);
      const nowLeast = size < least ? size : least;
      const nowMost = size > most ? size : most;
      if (length > 0 && sample * last > 0 && nowMost - nowLeast <= likeWithin * nowMost) {
        largestStep = Math.max(largestStep, Math.abs(sample - last));
        least = nowLeast;
        most = nowMost;
        last = sample;
        length += 1;
        return;
      }
      // Most runs are too short to be a top.
      if (length >= shortestLike) end(sample);
      length = 1;
      least = size;
      most = size;
      last = sample;
      largestStep = 0;
      entered = size - Math.sign(sample) * previous;
    },
    /** Size of the third largest; 0 where there are fewer. */
    thirdLargest: () => largest[2],
  };
}

const noTops: TrackFacts['clipping'] = { runs: [], runCount: 0, clippedSamples: 0 };

function nearThePeak(flat: ReadonlyMap<number, Tops>, peak: number): TrackFacts['clipping'] {
  const near = [...flat].filter(([size]) => size >= peak * nearPeak).map(([, tops]) => tops);
  const runCount = near.reduce((sum, { count }) => sum + count, 0);
  if (runCount < fewestFlat) return noTops;
  const runs = near.flatMap((tops) => tops.runs).sort((a, b) => a.startSample - b.startSample);
  const clippedSamples = near.reduce((sum, { samples }) => sum + samples, 0);
  return { runs: runs.slice(0, runsKept), runCount, clippedSamples };
}

function clipRun({ start, length }: { start: number; length: number }, size: number): ClipRun {
  return { startSample: start, lengthSamples: length, levelDbfs: amplitudeDb(size) ?? 0 };
}
