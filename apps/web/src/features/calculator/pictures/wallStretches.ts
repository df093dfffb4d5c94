import { surfacePlaces } from '@thudline/contracts';
import type { RoomSize } from '@thudline/dsp';
import type { KnownSurface, SurfacePlace } from '../knownRoom';
import { placesOf } from '../spots';
import type { TreatmentPlan } from '../treatmentPlan';

export type Wall = Extract<SurfacePlace, 'front' | 'back' | 'left' | 'right'>;

/** A stretch of a wall in metres along it, from the left or from the front. */
export interface WallStretch {
  wall: Wall;
  fromM: number;
  toM: number;
}

const walls = surfacePlaces.filter((place) => place !== 'floor' && place !== 'ceiling');
const isWall = (place: SurfacePlace | null): place is Wall => walls.some((wall) => wall === place);
const wallLengthM = (wall: Wall, { lengthM, widthM }: RoomSize) =>
  wall === 'front' || wall === 'back' ? lengthM : widthM;

/** So much of a wall, from floor to ceiling, in its middle. */
function inTheMiddle(wall: Wall, areaM2: number, size: RoomSize, highM = size.heightM): WallStretch {
  const wholeM = wallLengthM(wall, size);
  const longM = Math.min(wholeM, areaM2 / highM);
  return { wall, fromM: (wholeM - longM) / 2, toM: (wholeM + longM) / 2 };
}

/** The planned treatment, where it stands on walls. */
export function plannedOnWalls({ areaM2, spot }: TreatmentPlan, size: RoomSize): WallStretch[] {
  const places = placesOf(spot, size);
  return places.filter(isWall).map((wall) => inTheMiddle(wall, areaM2 / places.length, size));
}

/** The planned treatment on the floor or the ceiling, as wide as the room is to its length; metres. */
export function plannedFlat(
  { areaM2, spot }: TreatmentPlan,
  size: RoomSize,
): { lengthM: number; widthM: number } | null {
  if (spot !== 'floor' && spot !== 'ceiling') return null;
  const share = Math.sqrt(Math.min(1, areaM2 / (size.lengthM * size.widthM)));
  return { lengthM: size.lengthM * share, widthM: size.widthM * share };
}

const soft = ['heavy-curtain', 'carpet', 'fibre', 'light-fibre'];

/** What is soft already. */
export const softOnWalls = (surfaces: readonly KnownSurface[], size: RoomSize): WallStretch[] =>
  surfaces.flatMap(({ place, areaM2, materialId }) =>
    isWall(place) && soft.some((start) => materialId.startsWith(start))
      ? [inTheMiddle(place, areaM2, size)]
      : [],
  );

/** Doors are told by their area only; this high. */
const doorHighM = 2.1;

export const doorsInWalls = (surfaces: readonly KnownSurface[], size: RoomSize): WallStretch[] =>
  surfaces.flatMap(({ place, areaM2, materialId }) =>
    isWall(place) && materialId === 'timber-door' ? [inTheMiddle(place, areaM2, size, doorHighM)] : [],
  );
