import { assertPositive } from '../../assert';
import { dbPower, powerDb } from '../../decibel';
import { createSpanCutter, type Border, type Spans } from '../spans';
import { kWeighting } from './kWeighting';

export interface Loudness {
  push(block: Float32Array, spans?: Spans): void;
  result(): { readonly integratedLufs: number | null };
}

/** All from BS.1770-5 Annex 1: blocks of 400 ms that overlap by 75 %, the offset of equation 2, both gates. */
const stepS = 0.1;
const stepsInBlock = 4;
const offsetDb = -0.691;
const absoluteGateLufs = -70;
const relativeGateDb = -10;

export interface LoudnessOptions {
  readonly sampleRateHz: number;
  /** Which of the spans' filters is the K-weighting; unless told, samples are weighted here. */
  readonly weighted?: number;
}

/** @returns where spans must end so that loudness can be told from them */
export function loudnessBorder(sampleRateHz: number): Border {
  let step = 0;
  return (at) => {
    while (endOfStep(step, sampleRateHz) <= at) step += 1;
    return endOfStep(step, sampleRateHz);
  };
}

/**
 * Integrated loudness of one microphone: K-weighted power of the 400 ms blocks that pass both gates, one channel of
 * weight 1.
 *
 * A full-scale sine at 997 Hz reads −3.01. Steps of 100 ms are cut at the nearest sample, so every rate will do; an
 * incomplete last block isn't used.
 *
 * @param options.sampleRateHz - > 0
 * @returns a meter; LUFS, null where no whole block is louder than −70 LUFS
 * @throws {SignalError} `option`
 * @see ITU-R BS.1770-5 (11/2023), Annex 1, equations 2, 6 and 7
 * @example
 * const loudness = createLoudness({ sampleRateHz: 48000 });
 * loudness.push(Float32Array.from({ length: 96000 }, (_, n) => Math.sin((2 * Math.PI * 997 * n) / 48000)));
 * loudness.result().integratedLufs // -3.01
 */
export function createLoudness(options: LoudnessOptions): Loudness {
  const { sampleRateHz, weighted } = options;
  assertPositive(sampleRateHz, 'sampleRateHz');
  const alone = createSpanCutter([loudnessBorder(sampleRateHz)], [kWeighting(sampleRateHz)]);
  const steps: { energy: number; length: number }[] = [];
  const blockPowers: number[] = [];
  let current = { energy: 0, length: 0 };
  let stepCount = 0;
  let stepEnd = endOfStep(0, sampleRateHz);
  let position = 0;

  const closeStep = (): void => {
    steps.push(current);
    stepCount += 1;
    stepEnd = endOfStep(stepCount, sampleRateHz);
    current = { energy: 0, length: 0 };
    if (steps.length > stepsInBlock) steps.shift();
    if (steps.length === stepsInBlock) blockPowers.push(powerOf(steps));
  };

  return {
    push(block, spans) {
      const cut = spans && weighted !== undefined ? spans : alone.cut(block);
      const energies = cut.heard[weighted ?? 0];
      for (let span = 0, from = 0; span < cut.count; from = cut.ends[span], span += 1) {
        current.energy += energies[span];
        current.length += cut.ends[span] - from;
        position += cut.ends[span] - from;
        if (position === stepEnd) closeStep();
      }
    },
    result: () => ({ integratedLufs: gatedLoudness(blockPowers) }),
  };
}

function endOfStep(step: number, sampleRateHz: number): number {
  return Math.round((step + 1) * stepS * sampleRateHz);
}

function powerOf(steps: readonly { energy: number; length: number }[]): number {
  let energy = 0;
  let length = 0;
  for (const step of steps) {
    energy += step.energy;
    length += step.length;
  }
  return energy / length;
}

function gatedLoudness(powers: readonly number[]): number | null {
  const loud = powers.filter((power) => power > dbPower(absoluteGateLufs - offsetDb));
  if (loud.length === 0) return null;
  const relativeGate = mean(loud) * dbPower(relativeGateDb);
  const level = powerDb(mean(loud.filter((power) => power > relativeGate)));
  return level === null ? null : level + offsetDb;
}

function mean(values: readonly number[]): number {
  return values.reduce((sum, value) => sum + value, 0) / values.length;
}
