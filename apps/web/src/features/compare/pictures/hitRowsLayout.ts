import type { ReportResponse } from '@thudline/contracts';
import type { CommonTime } from '../commonTime';

export interface RowTick {
  x: number;
  heightPx: number;
}

const leftPx = 26;
const rightPx = 8;
const tick = { shortestPx: 7, longestPx: 19, rangeDb: 18 };

/** Seconds of the common time to px and back; the marks of the rows stand left of the axis. */
export function hitRowsScale({ startS, endS }: CommonTime, widthPx: number) {
  const span = widthPx - leftPx - rightPx;
  return {
    leftPx,
    x: (timeS: number) => leftPx + ((timeS - startS) / (endS - startS)) * span,
    timeS: (x: number) => Math.min(endS, Math.max(startS, startS + ((x - leftPx) / span) * (endS - startS))),
  };
}

/** Times of the kick hits, on the common time. */
export const kickTimesS = ({ hits }: Pick<ReportResponse, 'hits'>, zeroS: number): number[] =>
  hits.flatMap((hit) => (hit.kind === 'kick' ? [hit.timeS - zeroS] : []));

/** A tick for every kick hit, the harder the taller. */
export function rowTicks(
  { hits }: Pick<ReportResponse, 'hits'>,
  { zeroS, endS, x }: { zeroS: number; endS: number; x: (timeS: number) => number },
): RowTick[] {
  const kicks = hits.filter((hit) => hit.kind === 'kick' && hit.timeS - zeroS <= endS);
  const loudestDbfs = Math.max(-120, ...kicks.map((hit) => hit.kickPeakDbfs ?? -120));
  return kicks.map((hit) => {
    const below = Math.min(tick.rangeDb, loudestDbfs - (hit.kickPeakDbfs ?? -120));
    const heightPx = tick.longestPx - (below / tick.rangeDb) * (tick.longestPx - tick.shortestPx);
    return { x: x(hit.timeS - zeroS), heightPx };
  });
}

/** Which hit lies nearest to a time, among those both takes have. */
export function nearestHit(rows: readonly (readonly number[])[], timeS: number): number {
  const count = Math.min(...rows.map((row) => row.length));
  let nearest = 0;
  const away = (i: number) => Math.min(...rows.map((row) => Math.abs(row[i] - timeS)));
  for (let i = 1; i < count; i++) if (away(i) < away(nearest)) nearest = i;
  return nearest;
}
