import type { RoomSize } from '@thudline/dsp';
import type { PlanLayout } from '../../rooms/pictures/planLayout';
import type { WallStretch } from './wallStretches';

interface Point {
  x: number;
  y: number;
}

/** A stretch of wall in px, with the way into the room. */
export function wallLine(
  { wall, fromM, toM }: WallStretch,
  { lengthM, widthM }: RoomSize,
  { at }: Pick<PlanLayout, 'at'>,
): { from: Point; to: Point; inward: Point } {
  switch (wall) {
    case 'front':
      return { from: at({ xM: fromM, yM: 0 }), to: at({ xM: toM, yM: 0 }), inward: { x: 0, y: -1 } };
    case 'back':
      return { from: at({ xM: fromM, yM: widthM }), to: at({ xM: toM, yM: widthM }), inward: { x: 0, y: 1 } };
    case 'left':
      return { from: at({ xM: 0, yM: fromM }), to: at({ xM: 0, yM: toM }), inward: { x: 1, y: 0 } };
    case 'right':
      return {
        from: at({ xM: lengthM, yM: fromM }),
        to: at({ xM: lengthM, yM: toM }),
        inward: { x: -1, y: 0 },
      };
  }
}

const wavePx = 18;
const deepPx = 3.5;
const awayPx = 8;

/** A soft wave along a wall, a little into the room. */
export function wavePath(from: Point, to: Point, inward: Point): string {
  const longPx = Math.hypot(to.x - from.x, to.y - from.y);
  const count = Math.max(2, 2 * Math.round(longPx / wavePx));
  const place = (part: number, sidePx: number) => {
    const x = from.x + (to.x - from.x) * part + inward.x * (awayPx + sidePx);
    const y = from.y + (to.y - from.y) * part + inward.y * (awayPx + sidePx);
    return `${Number(x.toFixed(1))} ${Number(y.toFixed(1))}`;
  };
  const bends = Array.from({ length: count }, (_, i) => {
    const side = i % 2 === 0 ? 2 * deepPx : -2 * deepPx;
    return `Q${place((i + 0.5) / count, side)} ${place((i + 1) / count, 0)}`;
  });
  return `M${place(0, 0)}${bends.join('')}`;
}
