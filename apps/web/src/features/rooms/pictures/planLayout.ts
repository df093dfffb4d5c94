import type { RoomResponse } from '@thudline/contracts';

export interface PlanLayout {
  widthPx: number;
  heightPx: number;
  pxPerM: number;
  /** A place of the room in the picture; the front is at the bottom. */
  at: (place: { xM: number; yM: number }) => { x: number; y: number };
}

const wallPx = 3;

/** The plan drawn to scale into a width; null where the room's length and width aren't known. */
export function planLayout(
  shape: RoomResponse['shape'],
  widthPx: number,
  mostHeightPx = 260,
): PlanLayout | null {
  if (shape.kind !== 'box' || shape.lengthM === null || shape.widthM === null) return null;
  const { lengthM, widthM } = shape;
  const pxPerM = Math.min((widthPx - 2 * wallPx) / lengthM, (mostHeightPx - 2 * wallPx) / widthM);
  return {
    widthPx: lengthM * pxPerM + 2 * wallPx,
    heightPx: widthM * pxPerM + 2 * wallPx,
    pxPerM,
    at: ({ xM, yM }) => ({
      x: wallPx + Math.min(xM, lengthM) * pxPerM,
      y: wallPx + (widthM - Math.min(yM, widthM)) * pxPerM,
    }),
  };
}

/** A kit from above, in metres around its player's place: kick in front of the player, the rest around. */
export const kitPieces = [
  { name: 'kick', xM: 0.45, yM: 0, radiusM: 0.28 },
  { name: 'snare', xM: 0.05, yM: 0.28, radiusM: 0.18 },
  { name: 'floor tom', xM: 0.1, yM: -0.45, radiusM: 0.21 },
  { name: 'hats', xM: 0.2, yM: 0.6, radiusM: 0.18 },
  { name: 'ride', xM: 0.55, yM: -0.55, radiusM: 0.26 },
  { name: 'crash', xM: 0.65, yM: 0.52, radiusM: 0.22 },
] as const;
