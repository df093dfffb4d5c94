import type { KitPlace } from '@thudline/contracts';
import { modePressure, type RoomMode, type RoomSize } from '@thudline/dsp';

/** The kick stands this far in front of whoever plays it; as the plan draws it. */
const kickAheadM = 0.45;
/** Below, the room gives next to nothing; above, nearly all it has; ours. */
const nextToNothing = 0.35;
const nearlyAll = 0.75;
/** Where moving has brought it. */
const halfway = 0.5;
const stepM = 0.25;
const farthestM = 2;
/** A kit and its player need room to the wall. */
const toWallM = 0.6;

export type KitStand = 'none' | 'some' | 'strong' | 'same-everywhere';
export type WallOnPlan = 'left' | 'right' | 'front' | 'back';

export interface KitHint {
  stand: KitStand;
  /** The shortest way to a fair place; null where none is needed, or none is near. */
  move: { distanceM: number; toward: WallOnPlan } | null;
}

const ways: { toward: WallOnPlan; x: number; y: number }[] = [
  { toward: 'right', x: 1, y: 0 },
  { toward: 'left', x: -1, y: 0 },
  { toward: 'back', x: 0, y: 1 },
  { toward: 'front', x: 0, y: -1 },
];

/** How a kit stands to a mode, seen from above: the kick is near the floor, where height takes nothing away. */
export function kitHint({ order }: RoomMode, size: RoomSize, kit: KitPlace): KitHint {
  if (order[0] === 0 && order[1] === 0) return { stand: 'same-everywhere', move: null };
  const turned = (kit.turnedDeg * Math.PI) / 180;
  const pressureWhenMoved = (xM: number, yM: number) =>
    modePressure(order, size, {
      xM: kit.xM + xM + kickAheadM * Math.cos(turned),
      yM: kit.yM + yM + kickAheadM * Math.sin(turned),
      zM: 0,
    });
  const here = pressureWhenMoved(0, 0);
  const stand = here < nextToNothing ? 'none' : here > nearlyAll ? 'strong' : 'some';
  if (stand === 'some') return { stand, move: null };
  for (let distanceM = stepM; distanceM <= farthestM; distanceM += stepM)
    for (const { toward, x, y } of ways) {
      const [xM, yM] = [kit.xM + x * distanceM, kit.yM + y * distanceM];
      const fits =
        xM >= toWallM && yM >= toWallM && xM <= size.lengthM - toWallM && yM <= size.widthM - toWallM;
      if (!fits) continue;
      const there = pressureWhenMoved(x * distanceM, y * distanceM);
      if (stand === 'none' ? there >= halfway : there <= halfway)
        return { stand, move: { distanceM, toward } };
    }
  return { stand, move: null };
}
