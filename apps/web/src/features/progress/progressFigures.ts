import type { ProgressFigure, TakeProgress } from '@thudline/contracts';

export const figureWords: Record<ProgressFigure, string> = {
  'level-spread': 'level spread of kicks',
  'cymbals-over-drums': 'cymbals against drums',
  headroom: 'headroom of the hardest kick',
};

export const figureMeaning: Record<ProgressFigure, string> = {
  'level-spread':
    'How far apart the kicks of a take are: the middle half of their peaks lies within so many dB. Lower is more even; a take that is meant to have soft and loud kicks has more.',
  'cymbals-over-drums':
    'How much louder the cymbals are than the drums at the overhead, both as loud as they sound. Above 0 the cymbals win.',
  headroom:
    'How far the hardest kick stays under full scale. A cross is a take that clipped: there it can’t be told.',
};

export const valueOf = (take: TakeProgress, figure: ProgressFigure): number | null => {
  switch (figure) {
    case 'level-spread':
      return take.levelSpreadDb;
    case 'cymbals-over-drums':
      return take.cymbalsOverDrumsDb;
    case 'headroom':
      return take.headroomDb;
  }
};

/** A take that tells the figure. */
export interface ProgressPoint {
  take: TakeProgress;
  timeMs: number;
  value: number;
}

export const pointsOf = (takes: readonly TakeProgress[], figure: ProgressFigure): ProgressPoint[] =>
  takes.flatMap((take) => {
    const value = valueOf(take, figure);
    return value === null ? [] : [{ take, timeMs: Date.parse(take.recordedAt), value }];
  });

const dayMs = 24 * 60 * 60 * 1000;
export const weekMs = 7 * dayMs;
/** 1 January 1970 was a Thursday: three days after a Monday. */
const mondayOffsetMs = 3 * dayMs;

/** Monday, midnight UTC, of the week that holds a time. */
export const weekStart = (timeMs: number): number =>
  Math.floor((timeMs + mondayOffsetMs) / weekMs) * weekMs - mondayOffsetMs;

export interface ProgressWeek {
  startMs: number;
  points: ProgressPoint[];
  middle: number;
}

/** Week by week, oldest first; weeks without a take are left out. */
export function weeksOf(points: readonly ProgressPoint[]): ProgressWeek[] {
  const byWeek = new Map<number, ProgressPoint[]>();
  for (const point of points) {
    const start = weekStart(point.timeMs);
    byWeek.set(start, [...(byWeek.get(start) ?? []), point]);
  }
  return [...byWeek]
    .sort(([one], [other]) => one - other)
    .map(([startMs, inside]) => ({
      startMs,
      points: inside,
      middle: middleOf(inside.map(({ value }) => value)),
    }));
}

export function middleOf(values: readonly number[]): number {
  const sorted = [...values].sort((one, other) => one - other);
  const at = (sorted.length - 1) / 2;
  return (sorted[Math.floor(at)] + sorted[Math.ceil(at)]) / 2;
}
