import type { ReportResponse } from '@thudline/contracts';

type Hits = Pick<ReportResponse, 'hits'>;

/** Indexes of the kick hits in a report's hits. */
export const kickHitsOf = ({ hits }: Hits): number[] =>
  hits.flatMap((hit, i) => (hit.kind === 'kick' ? [i] : []));

/** The hit to begin with: the loudest kick, since gain and polarity are judged by it. */
export function loudestHit({ hits }: Hits, kickHits: readonly number[]): number | null {
  return best(kickHits, (index) => hits[index].kickPeakDbfs ?? -Infinity);
}

/** A dot of the overhead's line may be a snare or a crash: the trace then shows the kick nearest to it. */
export function nearestHit({ hits }: Hits, kickHits: readonly number[], index: number): number | null {
  return best(kickHits, (other) => -Math.abs(hits[other].timeS - hits[index].timeS));
}

function best(indexes: readonly number[], worth: (index: number) => number): number | null {
  return indexes.reduce<number | null>(
    (top, index) => (top === null || worth(index) > worth(top) ? index : top),
    null,
  );
}
