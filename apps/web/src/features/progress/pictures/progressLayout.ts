import { valueScale } from '../../rooms/pictures/trendLayout';
import { weekMs, weeksOf, weekStart, type ProgressPoint } from '../progressFigures';

export interface ProgressSize {
  widthPx: number;
  topPx: number;
  heightPx: number;
  leftPx: number;
  rightPx: number;
}

export interface ProgressLayout {
  ticks: { value: number; y: number }[];
  months: { at: Date; x: number }[];
  points: { point: ProgressPoint; x: number; y: number }[];
  /** The middle value of each week that has takes. */
  weeks: { fromX: number; toX: number; y: number }[];
  /** Where takes stand that clipped, so that nothing is told of them: on the lowest line. */
  crosses: { number: number; x: number; y: number }[];
}

/** Takes over whole weeks: a ring a take, a thick line a week. */
export function progressLayout(
  points: readonly ProgressPoint[],
  clipped: readonly { number: number; timeMs: number }[],
  { widthPx, topPx, heightPx, leftPx, rightPx }: ProgressSize,
): ProgressLayout {
  const times = [...points, ...clipped].map(({ timeMs }) => timeMs);
  const from = weekStart(Math.min(...times));
  const to = weekStart(Math.max(...times)) + weekMs;
  const scale = valueScale(points.map(({ value }) => ({ value, iqr: null })));
  const x = (timeMs: number) => leftPx + ((timeMs - from) / (to - from)) * (widthPx - leftPx - rightPx);
  const y = (value: number) => topPx + ((scale.max - value) / (scale.max - scale.min)) * heightPx;
  return {
    ticks: scale.ticks.map((value) => ({ value, y: y(value) })),
    months: monthsBetween(from, to).map((at) => ({ at, x: x(at.getTime()) })),
    points: points.map((point) => ({ point, x: x(point.timeMs), y: y(point.value) })),
    weeks: weeksOf(points).map(({ startMs, middle }) => ({
      fromX: x(startMs),
      toX: x(startMs + weekMs),
      y: y(middle),
    })),
    crosses: clipped.map(({ number, timeMs }) => ({ number, x: x(timeMs), y: topPx + heightPx })),
  };
}

const mostMonths = 8;

function monthsBetween(from: number, to: number): Date[] {
  const start = new Date(from);
  const months: Date[] = [];
  for (let i = 0; ; i++) {
    const at = new Date(Date.UTC(start.getUTCFullYear(), start.getUTCMonth() + i, 1));
    if (at.getTime() > to) break;
    if (at.getTime() >= from) months.push(at);
  }
  const every = Math.ceil(months.length / mostMonths);
  return months.filter((_, i) => i % every === 0);
}
