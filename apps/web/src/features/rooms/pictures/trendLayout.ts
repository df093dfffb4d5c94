import type { RoomChangeResponse, RoomTrendResponse } from '@thudline/contracts';

type Point = RoomTrendResponse['points'][number];
type Change = Pick<RoomChangeResponse, 'number' | 'happenedOn' | 'what'>;

const dayMs = 24 * 60 * 60 * 1000;

export interface TrendSize {
  widthPx: number;
  topPx: number;
  heightPx: number;
  leftPx: number;
  rightPx: number;
}

interface TrendSpan {
  fromX: number;
  toX: number;
  middleY: number;
  /** The pale band: half the usual spread over hits on either side of the middle value. */
  bandTopY: number;
  bandBottomY: number;
}

export interface TrendLayout {
  ticks: { value: number; y: number }[];
  months: { at: Date; x: number }[];
  points: { point: Point; x: number; y: number; lowY: number; highY: number }[];
  verticals: { change: Change; x: number; labelX: number; hasTakesAfter: boolean }[];
  spans: TrendSpan[];
}

/** One take or many: places in px for the picture of a figure over time. */
export function trendLayout(
  points: readonly Point[],
  changes: readonly Change[],
  { widthPx, topPx, heightPx, leftPx, rightPx }: TrendSize,
): TrendLayout {
  const marks = [...changes].sort((one, other) => one.number - other.number);
  const times = [...points.map(timeOf), ...marks.map(dayOf)];
  const [from, to] = spanOf(times);
  const scale = valueScale(points);
  const x = (time: number) => leftPx + ((time - from) / (to - from)) * (widthPx - leftPx - rightPx);
  const y = (value: number) => topPx + ((scale.max - value) / (scale.max - scale.min)) * heightPx;
  const badges = spread(
    marks.map((mark) => x(dayOf(mark))),
    widthPx,
  );
  return {
    ticks: scale.ticks.map((value) => ({ value, y: y(value) })),
    months: monthStarts(from, to).map((at) => ({ at, x: x(at.getTime()) })),
    points: points.map((point) => {
      const half = (point.iqr ?? 0) / 2;
      return {
        point,
        x: x(timeOf(point)),
        y: y(point.value),
        lowY: y(point.value - half),
        highY: y(point.value + half),
      };
    }),
    verticals: marks.map((change, i) => ({
      change,
      x: x(dayOf(change)),
      labelX: badges[i],
      hasTakesAfter: points.some((point) => timeOf(point) >= dayOf(change)),
    })),
    spans: spansBetween(points, marks, { x, y, to }),
  };
}

const timeOf = ({ recordedAt }: Point) => Date.parse(recordedAt);
const dayOf = ({ happenedOn }: Change) => Date.parse(`${happenedOn}T00:00:00Z`);

/** A day's room on both sides, so that a single take has a place. */
function spanOf(times: readonly number[]): [number, number] {
  const from = Math.min(...times);
  const to = Math.max(...times);
  const room = Math.max(dayMs, (to - from) * 0.02);
  return [from - room, to + room];
}

function spansBetween(
  points: readonly Point[],
  marks: readonly Change[],
  { x, y, to }: { x: (time: number) => number; y: (value: number) => number; to: number },
): TrendSpan[] {
  const edges = [-Infinity, ...marks.map(dayOf), Infinity];
  return edges.slice(0, -1).flatMap((start, i) => {
    const end = edges[i + 1];
    const inside = points.filter((point) => timeOf(point) >= start && timeOf(point) < end);
    if (inside.length === 0) return [];
    const value = middle(inside.map((point) => point.value));
    const half = middle(inside.map(({ iqr }) => iqr ?? 0)) / 2;
    const first = timeOf(inside[0]);
    const last = timeOf(inside[inside.length - 1]);
    return {
      fromX: x(Number.isFinite(start) ? start : first),
      toX: x(Number.isFinite(end) ? end : Math.max(last, Math.min(to, last + dayMs / 2))),
      middleY: y(value),
      bandTopY: y(value + half),
      bandBottomY: y(value - half),
    };
  });
}

function middle(values: readonly number[]): number {
  const sorted = [...values].sort((a, b) => a - b);
  const at = (sorted.length - 1) / 2;
  return (sorted[Math.floor(at)] + sorted[Math.ceil(at)]) / 2;
}

/** Three to six round ticks around all values and their bars. */
export function valueScale(points: readonly Pick<Point, 'value' | 'iqr'>[]) {
  const low = Math.min(...points.map(({ value, iqr }) => value - (iqr ?? 0) / 2));
  const high = Math.max(...points.map(({ value, iqr }) => value + (iqr ?? 0) / 2));
  const step = roundStep(Math.max(high - low, Math.abs(high) * 0.1, 0.05) / 3);
  const first = Math.floor(low / step);
  const last = Math.max(first + 2, Math.ceil(high / step));
  const ticks = Array.from({ length: last - first + 1 }, (_, i) => Number(((first + i) * step).toFixed(6)));
  return { min: ticks[0], max: ticks[ticks.length - 1], ticks };
}

function roundStep(least: number): number {
  const power = 10 ** Math.floor(Math.log10(least));
  return (([1, 2, 5, 10] as const).find((digit) => digit * power >= least * 0.999) ?? 10) * power;
}

function monthStarts(from: number, to: number): Date[] {
  const start = new Date(from);
  const months: Date[] = [];
  for (let i = 0; i < 240; i++) {
    const at = new Date(Date.UTC(start.getUTCFullYear(), start.getUTCMonth() + i, 1));
    if (at.getTime() > to) break;
    if (at.getTime() >= from) months.push(at);
  }
  const every = Math.ceil(months.length / 8);
  return months.filter((_, i) => i % every === 0);
}

const badgePx = 26;

/** Numbers above the picture keep apart; a vertical bends to its own where two are near. */
export function spread(xs: readonly number[], widthPx: number): number[] {
  const placed: number[] = [];
  for (const x of xs) placed.push(Math.max(x, (placed.at(-1) ?? -Infinity) + badgePx));
  for (let i = placed.length - 1; i >= 0; i--) {
    const most = i === placed.length - 1 ? widthPx - badgePx / 2 : placed[i + 1] - badgePx;
    placed[i] = Math.max(badgePx / 2, Math.min(placed[i], most));
  }
  return placed;
}
