import type { LateStartFacts, PairFacts } from '../../facts';

/**
 * What can be told of a pair whose files don't start together: how many kick hits there are, and by how much to move one
 * file. Where the start ends and the way of the sound begins no sound tells, and 5 ms are half a period of 100 Hz: so
 * neither arrival nor polarity is told.
 */
export function notLinedUp(pair: PairFacts, lateStart: LateStartFacts): PairFacts {
  const { arrival, agreement } = pair;
  return {
    ...pair,
    lateStart,
    arrival: {
      arrivalMs: null,
      arrivalSamples: null,
      arrivalIqrMs: null,
      hitsUsed: arrival.hitsUsed,
      confidence: 0,
      firstSwing: arrival.firstSwing,
      reason: 'late-start',
    },
    agreement: {
      lowCorrelation: null,
      flipGainRecordedDb: null,
      flipGainMatchedDb: null,
      matchGainDb: agreement.matchGainDb,
      hitsUsed: agreement.hitsUsed,
      agreeingHits: 0,
      hitsAlike: null,
      verdict: 'cannot-tell',
      sure: false,
      reason: 'late-start',
      bands: [],
      lowCut: null,
      contraryBands: [],
      choices: [],
    },
    spectrum: null,
  };
}
