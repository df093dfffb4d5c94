import type { ReportResponse, Target } from '@thudline/contracts';

export interface StripHit {
  /** Index into the report's hits. */
  index: number;
  peakDbfs: number;
  /** It reached full scale in a take that clipped: how loud it was can't be told. */
  clipped: boolean;
}

/** In a clipped take, a hit this near to full scale is one of the clipped ones. */
const clippedFromDbfs = -0.1;

export const isClippedHit = (peakDbfs: number, trackClipped: boolean) =>
  trackClipped && peakDbfs >= clippedFromDbfs;

/** Clipped hits stand beyond the edge: their level is not known. */
export const beyondEdgePx = 15;

export interface Dot extends StripHit {
  x: number;
  /** Rows from the line: 0 on it, 1 below, −1 above, and so on. */
  row: number;
  hardest: boolean;
}

/** Height of the whole strip, and where the two lines run. */
export const stripHeightPx = 180;
export const stripRowsPx = { kick: 62, overhead: 128 };

/** dBFS → px across the strip; `dbfsAt` is the way back. */
export interface StripScale {
  (dbfs: number): number;
  dbfsAt: (xPx: number) => number;
  left: number;
  right: number;
}

export function stripScale(widthPx: number, startDbfs: number): StripScale {
  const left = widthPx < 480 ? 66 : 96;
  const right = widthPx - 34;
  const scale = (dbfs: number) =>
    left + ((Math.max(dbfs, startDbfs) - startDbfs) / -startDbfs) * (right - left);
  const dbfsAt = (xPx: number) => startDbfs - ((xPx - left) / (right - left)) * startDbfs;
  return Object.assign(scale, { dbfsAt, left, right });
}

/**
 * The kick line shows kick hits, and whatever else was louder in its file, since the level goes by the loudest; the
 * overhead's line every hit, since all of them share its preamp.
 */
export function stripHits(report: ReportResponse): { kick: StripHit[]; overhead: StripHit[] } {
  const withLevel = (peakDbfs: number | null, index: number, role: 'kick' | 'overhead') =>
    peakDbfs === null
      ? []
      : [{ index, peakDbfs, clipped: isClippedHit(peakDbfs, report[role].level === 'clipped') }];
  const kicks = report.hits.flatMap((hit) => (hit.kind === 'kick' ? (hit.kickPeakDbfs ?? []) : []));
  const loudestKickDbfs = Math.max(-Infinity, ...kicks);
  const isOnKickLine = ({ kind, kickPeakDbfs }: ReportResponse['hits'][number]) =>
    kind === 'kick' || (kickPeakDbfs ?? -Infinity) > loudestKickDbfs;
  return {
    kick: report.hits.flatMap((hit, i) => (isOnKickLine(hit) ? withLevel(hit.kickPeakDbfs, i, 'kick') : [])),
    overhead: report.hits.flatMap((hit, i) => withLevel(hit.overheadPeakDbfs, i, 'overhead')),
  };
}

const dotRadiusPx = 4.6;
const hardestRadiusPx = 6;
const gapPx = 1.4;
export const rowHeightPx = 9.6;
export const dotSizes = { dotRadiusPx, hardestRadiusPx };

/** The axis ends at −24 dBFS and goes lower, in steps of 6 dB, only where a hit or the target needs it. */
export function axisStartDbfs(peaksDbfs: readonly number[], target: Target): number {
  const lowest = Math.min(target.lowDbfs - 6, -24, ...peaksDbfs);
  return Math.max(-60, Math.floor(lowest / 6) * 6);
}

export function ticksDbfs(startDbfs: number, widthPx: number): number[] {
  const stepDb = (-startDbfs / 6) * 54 > widthPx ? 12 : 6;
  const ticks: number[] = [];
  for (let at = 0; at >= startDbfs; at -= stepDb) ticks.push(at === 0 ? 0 : at);
  return ticks.reverse();
}

/**
 * Where each hit's dot stands: on the line at its level, stacked below and above where dots would cover each other.
 * Never jittered: x is the level and nothing else.
 */
export function stackDots(hits: readonly StripHit[], xOf: (dbfs: number) => number): Dot[] {
  const hardestIndex = hits.reduce(
    (best, hit, i) => (hit.peakDbfs > (hits[best]?.peakDbfs ?? -Infinity) ? i : best),
    0,
  );
  const placed: Dot[] = [];
  const order = hits
    .map((hit, i) => ({ hit, hardest: i === hardestIndex }))
    .sort((a, b) => b.hit.peakDbfs - a.hit.peakDbfs);
  for (const { hit, hardest } of order) {
    const x = hit.clipped ? xOf(0) + beyondEdgePx : xOf(hit.peakDbfs);
    placed.push({ ...hit, x, hardest, row: freeRow(placed, x, hardest) });
  }
  return placed;
}

const radius = (hardest: boolean) => (hardest ? hardestRadiusPx : dotRadiusPx);

/** Nearest to the line first; the axis is closer below than the next line is above. */
const rows = [0, 1, -1, 2, -2, -3];

function freeRow(placed: readonly Dot[], x: number, hardest: boolean): number {
  const crowded = (row: number) =>
    placed.some(
      (dot) => dot.row === row && Math.abs(dot.x - x) < radius(dot.hardest) + radius(hardest) + gapPx,
    );
  // Where every row is taken, dots may cover each other: there are as many as can be seen.
  return rows.find((row) => !crowded(row)) ?? 0;
}

/** "down 6.5 dB", "up 5 dB": the half-decibel steps of the sentences, at least 0.5, without a needless zero. */
export function changeLabel(gainChangeDb: number, clipped: boolean): string {
  const size = String(Math.max(0.5, Math.round(Math.abs(gainChangeDb) * 2) / 2));
  if (clipped) return `down at least ${size} dB`;
  return `${gainChangeDb < 0 ? 'down' : 'up'} ${size} dB`;
}
