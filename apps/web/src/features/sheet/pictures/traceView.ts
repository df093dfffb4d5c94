/** A stretch of time around the hit, in ms. */
export interface TraceView {
  fromMs: number;
  toMs: number;
}

/** What an excerpt holds around its hit, with room for the filter at both ends; and the closest look that still shows shape. */
const limits = { fromMs: -50, toMs: 600, shortestMs: 2 };

export const wholeViewMs = limits.toMs - limits.fromMs;

/** The view with its span changed by `factor`, up to `widest` ms, the time under `atMs` staying where it is. */
export function zoomed(
  { fromMs, toMs }: TraceView,
  { atMs, factor, widest = wholeViewMs }: { atMs: number; factor: number; widest?: number },
): TraceView {
  const span = Math.min(widest, Math.max(limits.shortestMs, (toMs - fromMs) * factor));
  const share = (atMs - fromMs) / (toMs - fromMs);
  return inside({ fromMs: atMs - share * span, toMs: atMs + (1 - share) * span });
}

/** The view moved by `byMs`, no further than there is sound. */
export const panned = ({ fromMs, toMs }: TraceView, byMs: number): TraceView =>
  inside({ fromMs: fromMs + byMs, toMs: toMs + byMs });

function inside({ fromMs, toMs }: TraceView): TraceView {
  const shift = Math.max(0, limits.fromMs - fromMs) - Math.max(0, toMs - limits.toMs);
  return { fromMs: fromMs + shift, toMs: toMs + shift };
}

/** Round times to write under a view: about `count` of them, in steps of 1, 2 or 5. */
export function ticksMs({ fromMs, toMs }: TraceView, count: number): number[] {
  const rough = (toMs - fromMs) / count;
  const power = 10 ** Math.floor(Math.log10(rough));
  const step = [1, 2, 5, 10].map((each) => each * power).find((each) => each >= rough) ?? 10 * power;
  const first = Math.ceil((fromMs + step * 0.15) / step);
  const last = Math.floor((toMs - step * 0.15) / step);
  return Array.from(
    { length: Math.max(0, last - first + 1) },
    (_, i) => Number(((first + i) * step).toPrecision(10)) + 0,
  );
}
