import { assertBetween, assertPositive } from '../../assert';
import type { TrackFacts } from '../../facts';
import { createClipping, fullScaleOf } from './clipping';
import { createDropouts } from './dropouts';
import { createFlatTops } from './flatTops';
import { joinedRuns } from './joinedRuns';
import { createLoudness } from '../loudness/loudness';
import { createSpanCutter, everySamples, type Border, type Spans } from '../spans';
import { createNoiseFloor, noiseFrameSamples, type QuietStretch } from './noiseFloor';
import { createPeakAndPower } from './peakAndPower';
import { createTruePeak } from './truePeak';

export interface TrackLevelOptions {
  readonly sampleRateHz: number;
  /** One quantisation step of the file (2^-15 for 16-bit); null for float files. */
  readonly quantisationStep: number | null;
  /** Which of the spans' filters is the K-weighting; unless told, samples are weighted here. */
  readonly weighted?: number;
}

export type TrackLevelFacts = Omit<TrackFacts, 'role' | 'loudestHitDbfs' | 'hum'>;

/** Sees a track once, in blocks of any size; the figures don't depend on how it was cut. */
export interface TrackLevel {
  /**
   * @param spans - cut at the {@link levelBorder}
   * @throws {SignalError} `not-finite`
   */
  push(block: Float32Array, spans?: Spans): void;
  result(): TrackLevelFacts;
  /** Where the noise floor was measured, for what is looked for in it; null where it can't be told. */
  quietStretch(): QuietStretch | null;
}

/** @returns where spans must end so that levels can be told from them */
export function levelBorder(sampleRateHz: number): Border {
  return everySamples(noiseFrameSamples(sampleRateHz));
}

/**
 * Every level of one microphone that needs no hits, in one pass.
 *
 * @throws {SignalError} a rate or a step that can't be
 * @see docs/measurements.md, 2
 * @example
 * const level = createTrackLevel({ sampleRateHz: 48000, quantisationStep: null });
 * level.push(Float32Array.from({ length: 48000 }, (_, n) => 0.5 * Math.sin((2 * Math.PI * n) / 48)));
 * level.result().samplePeakDbfs // -6.021
 * level.result().rmsDbfs // -9.031
 */
export function createTrackLevel(options: TrackLevelOptions): TrackLevel {
  assertPositive(options.sampleRateHz, 'sampleRateHz');
  if (options.quantisationStep !== null)
    assertBetween(options.quantisationStep, 2 ** -31, 0.5, 'quantisationStep');
  const alone = createSpanCutter([levelBorder(options.sampleRateHz)]);
  const peakAndPower = createPeakAndPower(options);
  const clipping = createClipping(options);
  const noiseFloor = createNoiseFloor(options);
  const truePeak = createTruePeak(options);
  const loudness = createLoudness(options);
  // The first one refuses what is no number.
  const flatTops = createFlatTops({ ...options, fullScale: fullScaleOf(options.quantisationStep) });
  const dropouts = createDropouts(options);
  const meters = [peakAndPower, clipping, noiseFloor, truePeak, loudness, flatTops, dropouts];

  return {
    push(block, spans = alone.cut(block)) {
      for (const meter of meters) meter.push(block, spans);
    },
    result() {
      const { flat, looksFlattened } = flatTops.result();
      return {
        ...peakAndPower.result(),
        ...truePeak.result(),
        ...loudness.result(),
        clipping: joinedRuns(clipping.result(), flat),
        looksFlattened,
        ...dropouts.result(),
        ...noiseFloor.result(),
      };
    },
    quietStretch: () => noiseFloor.quietStretch(),
  };
}
