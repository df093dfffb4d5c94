import { assertRoomSize, type RoomMode, type RoomSize } from './roomModes';

/** From the left, from the front and from the floor. */
export interface PlaceInRoom {
  readonly xM: number;
  readonly yM: number;
  readonly zM: number;
}

/**
 * How much of a mode's sound pressure there is at a place: 1 at the walls and wherever it is strongest, 0 where there is none.
 *
 * Of hard walls: |cos(pπx/L) · cos(qπy/W) · cos(rπz/H)|.
 *
 * @returns 0 … 1
 * @throws {SignalError} `option` for a measure of the room that is not above 0
 * @see Ballou (ed.), Handbook for Sound Engineers, 4th ed., chapter 6
 * @example
 * const size = { lengthM: 5, widthM: 4, heightM: 2.5 };
 * modePressure([1, 0, 0], size, { xM: 2.5, yM: 1, zM: 0 }) // 0
 */
export function modePressure(order: RoomMode['order'], size: RoomSize, { xM, yM, zM }: PlaceInRoom): number {
  assertRoomSize(size);
  const along = (halfWaves: number, place: number, lengthM: number): number =>
    Math.cos((halfWaves * Math.PI * place) / lengthM);
  return Math.abs(
    along(order[0], xM, size.lengthM) * along(order[1], yM, size.widthM) * along(order[2], zM, size.heightM),
  );
}
