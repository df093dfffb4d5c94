import type { RoomChangeResponse, RoomTrendResponse } from '@thudline/contracts';

type Point = RoomTrendResponse['points'][number];
type Change = Pick<RoomChangeResponse, 'number' | 'happenedOn' | 'what'>;

const dayMs = 24 * 60 * 60 * 1000;

/** What of the time is shown, in ms since 1970. */
export interface TimeView {
  fromMs: number;
  toMs: number;
}

export interface ViewMove {
  /** Of the time shown: below 1 is nearer. */
  factor?: number;
  /** In widths of what is shown; later is positive. */
  shift?: number;
}

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
  /** `roomPx`: what is free to the right of the number, for the change's name. */
  verticals: { change: Change; x: number; labelX: number; roomPx: number; hasTakesAfter: boolean }[];
  spans: TrendSpan[];
}

/** One take or many: places in px for the picture of a figure over time. */
export function trendLayout(
  points: readonly Point[],
  changes: readonly Change[],
  { widthPx, topPx, heightPx, leftPx, rightPx }: TrendSize,
  view: TimeView | null = null,
): TrendLayout {
  const { fromMs: from, toMs: to } = view ?? wholeTime(points, changes);
  const isShown = (time: number) => time >= from && time <= to;
  const allMarks = [...changes].sort((one, other) => one.number - other.number);
  const marks = allMarks.filter((mark) => isShown(dayOf(mark)));
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
    points: points
      .filter((point) => isShown(timeOf(point)))
      .map((point) => {
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
      roomPx: (badges[i + 1] ?? widthPx) - badges[i] - badgePx,
      hasTakesAfter: points.some((point) => timeOf(point) >= dayOf(change)),
    })),
    spans: spansBetween(points, allMarks, { x, y, to }).flatMap((span) => clipped(span, x(from), x(to))),
  };
}

/** All takes and changes, with a day's room on both sides, so that a single take has a place. */
export function wholeTime(points: readonly Point[], changes: readonly Change[]): TimeView {
  const times = [...points.map(timeOf), ...changes.map(dayOf)];
  const [fromMs, toMs] = [Math.min(...times), Math.max(...times)];
  const roomMs = Math.max(dayMs, (toMs - fromMs) * 0.02);
  return { fromMs: fromMs - roomMs, toMs: toMs + roomMs };
}

/** Nearer, wider or along; never beyond the whole time, and never nearer than two days. */
export function movedView(
  { fromMs, toMs }: TimeView,
  whole: TimeView,
  { factor = 1, shift = 0 }: ViewMove,
): TimeView {
  const wholeMs = whole.toMs - whole.fromMs;
  const shownMs = Math.min(wholeMs, Math.max(2 * dayMs, (toMs - fromMs) * factor));
  const middleMs = (fromMs + toMs) / 2 + shift * (toMs - fromMs);
  const startMs = Math.min(Math.max(middleMs - shownMs / 2, whole.fromMs), whole.toMs - shownMs);
  return { fromMs: startMs, toMs: startMs + shownMs };
}

function clipped(span: TrendSpan, leftX: number, rightX: number): TrendSpan[] {
  if (span.toX < leftX || span.fromX > rightX) return [];
  return [{ ...span, fromX: Math.max(span.fromX, leftX), toX: Math.min(span.toX, rightX) }];
}

const timeOf = ({ recordedAt }: Point) => Date.parse(recordedAt);
const dayOf = ({ happenedOn }: Change) => Date.parse(`${happenedOn}T00:00:00Z`);

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
