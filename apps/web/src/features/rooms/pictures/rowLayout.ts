import type { ChangeFigure } from '@thudline/contracts';

type Moved = Pick<ChangeFigure, 'change' | 'interval95' | 'step'>;

/** A row reaches this many steps worth mentioning to either side, so that all rows read alike. */
const leastSteps = 3;
const edgePx = 10;

/** Places of one figure's marks: the middle of the row is halfway between before and after. */
export function rowLayout({ change, interval95, step }: Moved, widthPx: number) {
  const log = (value: number) => (step.kind === 'share' ? Math.log1p(value) : value);
  const unit = step.kind === 'share' ? Math.log1p(step.size) : step.size;
  const moved = log(change ?? 0) / unit;
  const low = interval95 ? log(interval95.low) / unit : moved;
  const high = interval95 ? log(interval95.high) / unit : moved;
  const reach = Math.max(
    leastSteps,
    ...[moved, low, high].map((steps) => Math.abs(steps - moved / 2) * 1.15),
  );
  const x = (steps: number) => widthPx / 2 + ((steps - moved / 2) / reach) * (widthPx / 2 - edgePx);
  return {
    beforeX: x(0),
    afterX: x(moved),
    barFromX: interval95 ? x(low) : null,
    barToX: interval95 ? x(high) : null,
  };
}
