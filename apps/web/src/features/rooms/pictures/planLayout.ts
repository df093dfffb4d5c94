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

const placeStepM = 0.05;

/** The other way round: the place under a point of the picture, inside the room, to five centimetres. */
export function planPlace(
  { at, pxPerM }: PlanLayout,
  shape: RoomResponse['shape'],
  point: { x: number; y: number },
): { xM: number; yM: number } {
  const [lengthM, widthM] = shape.kind === 'box' ? [shape.lengthM ?? 0, shape.widthM ?? 0] : [0, 0];
  const origin = at({ xM: 0, yM: 0 });
  const within = (metres: number, mostM: number) =>
    Number(Math.max(0, Math.min(mostM, Math.round(metres / placeStepM) * placeStepM)).toFixed(2));
  return {
    xM: within((point.x - origin.x) / pxPerM, lengthM),
    yM: within((origin.y - point.y) / pxPerM, widthM),
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
