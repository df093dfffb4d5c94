import type { ComparedFigure } from '@thudline/contracts';

/** Every row is drawn in steps worth mentioning, so that all rows share one axis. */
export interface ChangeAxis {
  /** Steps from the middle to either edge. */
  steps: number;
  widthPx: number;
}

export interface ChangeMarks {
  ringX: number;
  discX: number;
  /** From the ring to the disc; null where the two touch. */
  arrow: { fromX: number; toX: number } | null;
  interval: { fromX: number; toX: number } | null;
  /** The disc lies further out than the axis reaches. */
  beyond: boolean;
}

export type DrawnFigure = Pick<ComparedFigure, 'change' | 'step' | 'interval95'>;

const narrowest = 3;
const widest = 7;
const ringPx = 6;
const edgePx = 9;

/** Wide enough for every change, never so wide that a step can no longer be seen. */
export function axisSteps(figures: readonly DrawnFigure[]): number {
  const largest = Math.max(0, ...figures.map(({ change, step }) => Math.abs(change ?? 0) / step));
  return Math.min(widest, Math.max(narrowest, Math.ceil(largest * 2) / 2));
}

const pxPerStep = ({ steps, widthPx }: ChangeAxis) => (widthPx / 2 - edgePx) / steps;

/** The band in which a change is too small to mention. */
export function smallBand(axis: ChangeAxis): { fromX: number; toX: number } {
  const half = pxPerStep(axis);
  return { fromX: axis.widthPx / 2 - half, toX: axis.widthPx / 2 + half };
}

/** Where ring, disc, arrow and interval of one row stand; null where its change can't be told. */
export function changeMarks({ change, step, interval95 }: DrawnFigure, axis: ChangeAxis): ChangeMarks | null {
  if (change === null) return null;
  const middle = axis.widthPx / 2;
  const x = (value: number) => {
    const inside = Math.min(axis.steps, Math.max(-axis.steps, value / step));
    return middle + inside * pxPerStep(axis);
  };
  const discX = x(change);
  const way = Math.sign(discX - middle);
  const length = Math.abs(discX - middle);
  return {
    ringX: middle,
    discX,
    arrow:
      length > 3 * ringPx ? { fromX: middle + way * (ringPx + 1), toX: discX - way * (ringPx + 2) } : null,
    interval: interval95 && { fromX: x(interval95.low), toX: x(interval95.high) },
    beyond: Math.abs(change) / step > axis.steps,
  };
}
