import type { HitFacts } from '../facts';
import type { TrackSource } from '../trackSource';
import type { KickCandidate } from './hits/kickCandidates';
import { playedEarlier } from './lateStart/playedEarlier';
import { overheadFacts, type OverheadFacts } from './overheadFacts';
import { readTrack, type ReadTrackOptions, type TrackReading } from './pass/trackReading';
import { readPairPart, type PairPart } from './readPairPart';

/**
 * The steps of a measurement that take long and need the samples. What they are asked and what they answer can cross a
 * thread, so that another one may take some of them.
 */
export interface TakeSteps {
  /** The one pass over a track. */
  pass(track: number, options: ReadTrackOptions): TrackReading;
  /** Some of a pair's kick hits. */
  pairPart(request: PairPartRequest, onProgress: (progress01: number) => void): Promise<PairPart>;
  /** What the overhead's own hits tell. */
  overhead(request: OverheadRequest): Promise<OverheadFacts>;
}

export interface PairPartRequest {
  /** Places of the two tracks. */
  readonly kick: number;
  readonly overhead: number;
  /** How much earlier the overhead's file is to be played than it stands. */
  readonly lateSamples: number;
  readonly candidates: readonly KickCandidate[];
  /** Which of the candidates are read; `to` is not included. */
  readonly from: number;
  readonly to: number;
}

export interface OverheadRequest {
  readonly place: number;
  readonly hits: readonly HitFacts[];
}

/** @param sources - all tracks of the take */
export function createTakeSteps(sources: readonly TrackSource[]): TakeSteps {
  return {
    pass: (track, options) => readTrack(sources[track], options),
    pairPart({ kick, overhead, lateSamples, ...part }, onProgress) {
      const linedUp = lateSamples === 0 ? sources[overhead] : playedEarlier(sources[overhead], lateSamples);
      return readPairPart({ ...part, kick: sources[kick], overhead: linedUp, onProgress });
    },
    overhead: ({ place, hits }) => overheadFacts(sources[place], { place, hits }),
  };
}
