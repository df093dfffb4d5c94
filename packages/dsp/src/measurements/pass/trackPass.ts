import type { HumFacts } from '../../facts';
import { butterworthBand } from '../filters/butterworth';
import { hopSamples } from '../hits/hopMeter';
import { LOW_BAND } from '../hits/kickCandidates';
import { BODY_BAND, BRIGHT_BAND } from '../hits/overheadHits';
import type { QuietStretch } from '../level/noiseFloor';
import { createTrackLevel, levelBorder, type TrackLevelFacts } from '../level/trackLevel';
import { kWeighting } from '../loudness/kWeighting';
import { loudnessBorder } from '../loudness/loudness';
import { createPeaks, peakBorder, type TrackPeaks } from '../peaks/peaks';
import { createSpanCutter, everySamples } from '../spans';
import { createSpanHops } from './spanHops';

/** What one block of a track says to the other tracks, hop by hop of 2 ms; only good until the next block. */
export interface TrackHops {
  /** Mean square of 30–150 Hz. */
  readonly low: Float64Array;
  /** Largest |x|. */
  readonly peaks: Float64Array;
  /** Mean squares of the bands by which hits are told; empty where nobody listens for them. */
  readonly body: Float64Array;
  readonly bright: Float64Array;
}

export interface PassedTrack {
  readonly level: TrackLevelFacts & { readonly hum: HumFacts | null };
  readonly outline: TrackPeaks;
}

export interface TrackPassOptions {
  readonly sampleRateHz: number;
  readonly quantisationStep: number | null;
  /** How many samples there will be. */
  readonly frames: number;
  /** Whether hits are listened for in this track, as in the overhead. */
  readonly listens: boolean;
}

export interface TrackPass {
  push(block: Float32Array): TrackHops;
  result(): { readonly level: TrackLevelFacts; readonly outline: TrackPeaks };
  /** Where hum is to be looked for; null where the noise floor can't be told. */
  quietStretch(): QuietStretch | null;
}

/** All that one pass over one track tells without knowing of the others. */
export function createTrackPass(options: TrackPassOptions): TrackPass {
  const { sampleRateHz, frames, listens } = options;
  const samplesPerHop = hopSamples(sampleRateHz);
  const borders = [
    levelBorder(sampleRateHz),
    loudnessBorder(sampleRateHz),
    peakBorder({ frames }),
    everySamples(samplesPerHop),
  ];
  const bands = listens ? [LOW_BAND, BODY_BAND, BRIGHT_BAND] : [LOW_BAND];
  const filters = bands.map((band) => butterworthBand({ sampleRateHz, ...band }));
  const cutter = createSpanCutter(borders, [kWeighting(sampleRateHz), ...filters]);
  const level = createTrackLevel({ ...options, weighted: 0 });
  const outline = createPeaks({ frames });
  const hops = createSpanHops({
    samplesPerHop,
    low: 1,
    body: listens ? 2 : null,
    bright: listens ? 3 : null,
  });
  return {
    push(block) {
      const spans = cutter.cut(block);
      level.push(block, spans);
      outline.push(block, spans);
      return hops.push(spans);
    },
    result: () => ({ level: level.result(), outline: outline.result() }),
    quietStretch: () => level.quietStretch(),
  };
}
