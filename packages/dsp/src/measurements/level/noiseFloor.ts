import { powerDb } from '../../decibel';
import type { TrackFacts } from '../../facts';
import { createSpanCutter, everySamples, type Spans } from '../spans';

export interface NoiseFloor {
  /** @param spans - cut at the ends of frames, see {@link noiseFrameSamples} */
  push(block: Float32Array, spans?: Spans): void;
  result(): Pick<TrackFacts, 'noiseFloorDbfs' | 'noiseFloorReason'>;
  quietStretch(): QuietStretch | null;
}

/** The second whose level is the noise floor, in frames of the file. */
export interface QuietStretch {
  readonly startFrame: number;
  readonly endFrame: number;
}

interface Frame {
  readonly sum: number;
  readonly energy: number;
}

/** All four of docs/measurements.md, 2; on real takes the error was at most 0.7 dB. */
const frameS = 0.05;
const framesInStretch = 20;
const widestSpreadDb = 6;
const widestHalvesDb = 1.5;
/** What double rounding leaves of a constant; a real converter's noise lies far above. */
const roundingPower = 1e-12;

/** @returns the length of the frames that a noise floor is looked for in */
export function noiseFrameSamples(sampleRateHz: number): number {
  return Math.max(1, Math.round(frameS * sampleRateHz));
}

/**
 * RMS of the lowest steady second: twenty 50 ms frames that stay within 6 dB, with halves that differ by 1.5 dB at most.
 *
 * Levels are taken about the second's own mean: a constant offset is no noise and has its own figure. Seconds move by
 * one frame. A file without such a second has no noise floor to tell, and never a guess. Peak-referenced dBFS.
 *
 * @param options.sampleRateHz - > 0
 * @returns a meter whose result is null with a reason where no second qualifies
 */
export function createNoiseFloor(options: { readonly sampleRateHz: number }): NoiseFloor {
  const frameLength = noiseFrameSamples(options.sampleRateHz);
  const alone = createSpanCutter([everySamples(frameLength)]);
  const frames: Frame[] = [];
  /** Sum and energy of the open frame; an array, since a number that a closure keeps is written to the heap each time. */
  const open = new Float64Array(2);
  let filled = 0;
  let lowestPower: number | null = null;
  let lowestEnd = 0;
  let closedFrames = 0;
  let sawStretch = false;
  let sawSilence = false;

  const closeFrame = () => {
    frames.push({ sum: open[0], energy: open[1] });
    closedFrames += 1;
    open.fill(0);
    filled = 0;
    if (frames.length > framesInStretch) frames.shift();
    if (frames.length < framesInStretch) return;
    sawStretch = true;
    const power = steadyPower(frames, frameLength);
    if (power === 0) sawSilence = true;
    else if (power !== null && (lowestPower === null || power < lowestPower)) {
      lowestPower = power;
      lowestEnd = closedFrames;
    }
  };

  return {
    push(block, spans = alone.cut(block)) {
      for (let span = 0, from = 0; span < spans.count; from = spans.ends[span], span += 1) {
        filled += spans.ends[span] - from;
        open[0] += spans.sums[span];
        open[1] += spans.energies[span];
        if (filled === frameLength) closeFrame();
      }
    },
    result() {
      if (lowestPower !== null) return { noiseFloorDbfs: powerDb(lowestPower), noiseFloorReason: null };
      if (!sawStretch) return { noiseFloorDbfs: null, noiseFloorReason: 'too-short' };
      return { noiseFloorDbfs: null, noiseFloorReason: sawSilence ? 'digital-silence' : 'no-quiet-second' };
    },
    quietStretch: () =>
      lowestPower === null
        ? null
        : {
            startFrame: (lowestEnd - framesInStretch) * frameLength,
            endFrame: lowestEnd * frameLength,
          },
  };
}

/** @returns mean power about the stretch's mean; 0 for digital silence; null where the stretch isn't steady */
function steadyPower(frames: readonly Frame[], frameLength: number): number | null {
  const count = frames.length * frameLength;
  const mean = frames.reduce((total, frame) => total + frame.sum, 0) / count;
  const energies = frames.map(({ sum, energy }) =>
    Math.max(0, energy - 2 * mean * sum + frameLength * mean * mean),
  );
  const whole = total(energies);
  if (whole <= roundingPower * frames.reduce((all, frame) => all + frame.energy, 0)) return 0;
  if (decibelsApart(Math.max(...energies), Math.min(...energies)) > widestSpreadDb) return null;
  const half = frames.length / 2;
  if (decibelsApart(total(energies.slice(0, half)), total(energies.slice(half))) > widestHalvesDb)
    return null;
  return whole / count;
}

function total(values: readonly number[]): number {
  return values.reduce((all, value) => all + value, 0);
}

function decibelsApart(a: number, b: number): number {
  return a === 0 || b === 0 ? Infinity : Math.abs(10 * Math.log10(a / b));
}
