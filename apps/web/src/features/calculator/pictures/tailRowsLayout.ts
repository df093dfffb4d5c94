import type { BandEstimate } from '../tailEstimate';

const discPx = 8;
const headPx = 6;
/** Shorter, and there is no room for an arrow. */
const leastArrowPx = 22;
const mostTicks = 5;

export interface TailRow {
  band: BandEstimate;
  beforeX: number | null;
  afterX: number | null;
  /** From ring to disc, without touching them; null where they lie too close. */
  arrow: { fromX: number; toX: number; headX: number } | null;
}

export interface TailRowsLayout {
  ticks: { seconds: number; x: number; text: string }[];
  rows: TailRow[];
}

/** Ring now, disc with the plan, an octave a row, on one axis of seconds from 0. */
export function tailRowsLayout(bands: readonly BandEstimate[], widthPx: number): TailRowsLayout {
  const values = bands.flatMap(({ before, after }) => [before.eyringS ?? 0, after.eyringS ?? 0]);
  const longestS = Math.max(0.1, ...values);
  const stepS = roundStep(longestS / (mostTicks - 1));
  const count = Math.ceil(longestS / stepS - 0.1);
  const endS = Math.max(count * stepS, longestS);
  const x = (seconds: number) => discPx + (seconds / endS) * (widthPx - 2 * discPx);
  return {
    ticks: Array.from({ length: count + 1 }, (_, i) => {
      const seconds = Number((i * stepS).toFixed(3));
      return { seconds, x: x(seconds), text: i === count ? `${seconds} s` : String(seconds) };
    }),
    rows: bands.map((band) => {
      const beforeX = band.before.eyringS === null ? null : x(band.before.eyringS);
      const afterX = band.after.eyringS === null ? null : x(band.after.eyringS);
      return { band, beforeX, afterX, arrow: arrowBetween(beforeX, afterX) };
    }),
  };
}

function arrowBetween(beforeX: number | null, afterX: number | null): TailRow['arrow'] {
  if (beforeX === null || afterX === null || Math.abs(beforeX - afterX) < leastArrowPx) return null;
  const way = afterX > beforeX ? 1 : -1;
  const toX = afterX - way * (discPx + 1);
  return { fromX: beforeX + way * discPx, toX, headX: toX - way * headPx };
}

function roundStep(least: number): number {
  const power = 10 ** Math.floor(Math.log10(least));
  return (([1, 2, 4, 5, 10] as const).find((digit) => digit * power >= least * 0.95) ?? 10) * power;
}
