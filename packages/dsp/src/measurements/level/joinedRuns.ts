import type { TrackFacts } from '../../facts';
import { runsKept } from './clipping';

type Clipping = TrackFacts['clipping'];

/** Runs at full scale and flat tops below it as one list in order of time; no sample lies in both. */
export function joinedRuns(a: Clipping, b: Clipping): Clipping {
  const runs = [...a.runs, ...b.runs].sort((one, other) => one.startSample - other.startSample);
  return {
    runs: runs.slice(0, runsKept),
    runCount: a.runCount + b.runCount,
    clippedSamples: a.clippedSamples + b.clippedSamples,
  };
}
