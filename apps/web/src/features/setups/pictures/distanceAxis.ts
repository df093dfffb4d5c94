import type { UserSettings } from '@thudline/contracts';
import { lengthUnitOf } from '../fieldUnits';

/** In the reader's unit; the last are for microphones a room apart. */
const steps = [5, 10, 25, 50, 100, 200, 500];
const mostSteps = 6;
/** How far the axis goes on behind what it shows. */
const room = 1.5;

export interface DistanceAxis {
  ticks: { share: number; label: string }[];
  /** Where a distance stands, 0 … 1 from the left. */
  shareOf: (lengthCm: number) => number;
}

/** An axis from nothing (or below it) to beyond the largest distance, in round numbers of the reader's unit. */
export function distanceAxis(
  lengthsCm: readonly number[],
  lengthUnit: UserSettings['lengthUnit'],
): DistanceAxis {
  const { toShown, words } = lengthUnitOf(lengthUnit);
  const shown = lengthsCm.map(toShown);
  const highest = Math.max(steps[0], ...shown) * room;
  const lowest = Math.min(0, ...shown) * room;
  const step =
    steps.find((each) => Math.ceil(highest / each) - Math.floor(lowest / each) <= mostSteps) ??
    steps[steps.length - 1];
  const [from, to] = [Math.floor(lowest / step), Math.ceil(highest / step)];
  const ticks = Array.from({ length: to - from + 1 }, (_, i) => {
    const value = (from + i) * step;
    const text = String(value).replace('-', '−');
    return { share: i / (to - from), label: i === to - from ? `${text} ${words}` : text };
  });
  return { ticks, shareOf: (lengthCm) => (toShown(lengthCm) / step - from) / (to - from) };
}
