import type { ReportFigures, TrackReport } from '../report/reportTypes';

/** A run belongs to a hit from just before its onset until it has decayed; our choice. */
const BEFORE_S = 0.02;
const AFTER_S = 0.3;

/** @returns how many hits hold a clipped run; 0 where the runs lie elsewhere or the hits aren't at hand */
export function clippedHits(figures: ReportFigures, track: TrackReport): number {
  const times = track.clipping.runs.map((run) => run.startSample / figures.sampleRateHz);
  const hit = new Set<number>();
  let next = 0;
  for (const timeS of times) {
    while (next + 1 < figures.hits.length && figures.hits[next + 1].timeS - BEFORE_S <= timeS) next += 1;
    const near = figures.hits.at(next);
    if (near && timeS >= near.timeS - BEFORE_S && timeS <= near.timeS + AFTER_S) hit.add(next);
  }
  return hit.size;
}
