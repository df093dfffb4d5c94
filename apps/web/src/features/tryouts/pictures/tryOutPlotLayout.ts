/** One take of the plot. */
export interface PlotPoint {
  id: string;
  value: number;
  /** Null where hits were too few for one. */
  interval: { low: number; high: number } | null;
  /** Null: the places stand side by side in their order. */
  position: number | null;
  /** Ring = now, disc = best. */
  mark: 'now' | 'best' | 'plain';
  /** As good as the best, as far as can be told. */
  asGood: boolean;
}

export interface PlotMark extends PlotPoint {
  x: number;
  y: number;
  lowY: number;
  highY: number;
  /** Take and figure beside it, or its figure alone over its bar, as there is room. */
  words: 'beside' | 'over' | 'none';
  /** Words stand left of the mark where the right edge is near. */
  wordsLeft: boolean;
  /** Whether there is room to write its position under the axis. */
  isNamed: boolean;
  /** Line of what stands under the position: the best gives way to how things stand now beside it. */
  belowRow: 0 | 1;
}

export interface PlotLayout {
  left: number;
  right: number;
  top: number;
  bottom: number;
  heightPx: number;
  ticks: { value: number; y: number; digits: number }[];
  zeroY: number | null;
  band: { top: number; bottom: number } | null;
  marks: PlotMark[];
  /** From the ring to the disc. */
  arrow: { path: string; head: string } | null;
}

const room = { left: 52, right: 16, top: 32, plotPx: 226, below: 44 };
/** From one line under the axis to the next. */
export const belowRowPx = 17;
const endPads = 0.14;
const wholeWordsPx = 88;
const valuePx = 36;
const namePx = 30;
const belowPx = 96;

/** Where everything of the plot stands: measure up, position across. */
export function tryOutPlotLayout({
  points,
  widthPx,
  showsZero,
}: {
  points: readonly PlotPoint[];
  widthPx: number;
  showsZero: boolean;
}): PlotLayout {
  const left = room.left;
  const right = Math.max(left + 120, widthPx - room.right);
  const top = room.top;
  const bottom = top + room.plotPx;
  const values = points.flatMap(({ value, interval }) => [
    value,
    interval?.low ?? value,
    interval?.high ?? value,
  ]);
  const axis = niceAxis(showsZero ? [0, ...values] : values);
  const y = (value: number) => bottom - ((value - axis.min) / (axis.max - axis.min)) * (bottom - top);
  const x = acrossScale(points, { left, right });
  const marks = points.map((point, index) => markOf(point, { x: x(index), y, left, right }));
  const spaced = withWords(marks, right);
  return {
    left,
    right,
    top,
    bottom,
    heightPx: bottom + room.below + (spaced.some(({ belowRow }) => belowRow > 0) ? belowRowPx : 0),
    ticks: axis.ticks.map((value) => ({ value, y: y(value), digits: axis.digits })),
    zeroY: axis.min <= 0 && axis.max >= 0 ? y(0) : null,
    band: bandOf(points, y),
    marks: spaced,
    arrow: arrowBetween(
      spaced.find(({ mark }) => mark === 'now'),
      spaced.find(({ mark }) => mark === 'best'),
    ),
  };
}

function acrossScale(points: readonly PlotPoint[], { left, right }: { left: number; right: number }) {
  const positions = points.map(({ position }) => position);
  const known = positions.filter((position) => position !== null);
  const [min, max] = [Math.min(...known), Math.max(...known)];
  const pad = (right - left) * endPads;
  const numeric = known.length === points.length && max > min;
  return (index: number): number => {
    if (numeric) return left + pad + ((known[index] - min) / (max - min)) * (right - left - 2 * pad);
    return left + ((index + 0.5) / Math.max(1, points.length)) * (right - left);
  };
}

function markOf(
  point: PlotPoint,
  { x, y }: { x: number; y: (value: number) => number; left: number; right: number },
): PlotMark {
  const { value, interval } = point;
  return {
    ...point,
    x,
    y: y(value),
    lowY: y(interval?.low ?? value),
    highY: y(interval?.high ?? value),
    words: 'none',
    wordsLeft: false,
    isNamed: true,
    belowRow: 0,
  };
}

/** Words stand beside every mark or over every mark; ring and disc always have their figure and their position. */
function withWords(marks: PlotMark[], right: number): PlotMark[] {
  const across = [...marks].sort((a, b) => a.x - b.x);
  const gapsPx = across.slice(1).map(({ x }, i) => x - across[i].x);
  const closestPx = Math.min(Infinity, ...gapsPx);
  const last = across.at(-1);
  const lastLeft =
    last !== undefined && right - last.x < wholeWordsPx && (gapsPx.at(-1) ?? Infinity) > 2 * wholeWordsPx;
  const beside = across.every((mark, i) =>
    mark === last && lastLeft ? true : Math.min(gapsPx[i] ?? Infinity, right - mark.x) >= wholeWordsPx,
  );
  const now = marks.find(({ mark }) => mark === 'now');
  return marks.map((mark) => {
    const isSpecial = mark.mark !== 'plain';
    const fits = (px: number) => closestPx >= px || isSpecial || farFromSpecial(mark, marks, px);
    return {
      ...mark,
      words: beside ? 'beside' : closestPx >= valuePx || isSpecial ? 'over' : 'none',
      wordsLeft: beside && lastLeft && mark === last,
      isNamed: fits(namePx),
      belowRow: mark.mark === 'best' && now && Math.abs(now.x - mark.x) < belowPx ? 1 : 0,
    };
  });
}

/** The first and the last position are told too, where they don't run into ring or disc. */
function farFromSpecial(mark: PlotMark, marks: readonly PlotMark[], px: number): boolean {
  const xs = marks.map(({ x }) => x);
  const isEnd = mark.x === Math.min(...xs) || mark.x === Math.max(...xs);
  return isEnd && marks.every((other) => other.mark === 'plain' || Math.abs(other.x - mark.x) >= px);
}

/**
 * From the worst that is as good as the best to the end of the best's interval; never over a take that is clearly worse,
 * since what is as good is told from differences, not from this picture.
 */
function bandOf(points: readonly PlotPoint[], y: (value: number) => number): PlotLayout['band'] {
  const best = points.find(({ mark, asGood }) => mark === 'best' && asGood);
  if (!best) return null;
  const good = points.filter(({ asGood }) => asGood).map(({ value }) => value);
  const worse = points.filter(({ asGood }) => !asGood).map(({ value }) => value);
  const { low, high } = best.interval ?? { low: best.value, high: best.value };
  const under = worse.filter((value) => value < best.value);
  const over = worse.filter((value) => value > best.value);
  const ends = {
    low: Math.max(Math.min(low, ...good), ...under.map((value) => (value + best.value) / 2)),
    high: Math.min(Math.max(high, ...good), ...over.map((value) => (value + best.value) / 2)),
  };
  return { top: y(ends.high), bottom: y(ends.low) };
}

const markPx = 8;

/** Leaves the ring upward and comes to the disc from its side. */
function arrowBetween(from: PlotMark | undefined, to: PlotMark | undefined): PlotLayout['arrow'] {
  if (!from || !to || Math.hypot(to.x - from.x, to.y - from.y) < 4 * markPx) return null;
  const way = to.x >= from.x ? 1 : -1;
  const start = { x: from.x + way * 5, y: from.y + (to.y < from.y ? -1 : 1) * markPx };
  const end = { x: to.x - way * (markPx + 5), y: to.y };
  const bend = Math.max(12, Math.abs(end.x - start.x) * 0.5);
  const path = `M${round(start.x)} ${round(start.y)}C${round(start.x + way * bend * 0.7)} ${round(
    (start.y + end.y) / 2,
  )} ${round(end.x - way * bend)} ${round(end.y)} ${round(end.x)} ${round(end.y)}`;
  const back = end.x - way * 8;
  return {
    path,
    head: `M${round(back)} ${round(end.y - 6)}L${round(end.x)} ${round(end.y)}L${round(back)} ${round(end.y + 6)}`,
  };
}

const round = (px: number) => Math.round(px * 10) / 10;

const niceSteps = [1, 2, 2.5, 5, 10];
const wantedSteps = 5;

/** Round numbers around all values. */
function niceAxis(values: readonly number[]): { min: number; max: number; ticks: number[]; digits: number } {
  const [lowest, highest] = [Math.min(...values), Math.max(...values)];
  const span = highest > lowest ? highest - lowest : 1;
  const raw = span / wantedSteps;
  const unit = 10 ** Math.floor(Math.log10(raw));
  const step = (niceSteps.find((size) => size * unit >= raw) ?? 10) * unit;
  const first = Math.floor(lowest / step + 1e-9);
  const last = Math.max(first + 1, Math.ceil(highest / step - 1e-9));
  const ticks = Array.from({ length: last - first + 1 }, (_, i) => (first + i) * step);
  const digits = Math.max(0, -Math.floor(Math.log10(step) + 1e-9)) + (String(step / unit) === '2.5' ? 1 : 0);
  return { min: first * step, max: last * step, ticks, digits: Math.min(3, digits) };
}
