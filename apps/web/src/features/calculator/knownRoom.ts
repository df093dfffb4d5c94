import { surfacePlaces, type RoomResponse, type RoomSurface } from '@thudline/contracts';
import { speedOfSoundMPerS, type RoomSize } from '@thudline/dsp';

export type SurfacePlace = (typeof surfacePlaces)[number];

/** A part of what encloses the room. */
export interface KnownSurface {
  /** Null in a room that is not a box: of its whole surface. */
  place: SurfacePlace | null;
  areaM2: number;
  materialId: string;
  /** Nobody said what it is. */
  guessed: boolean;
}

/** A room with everything that the estimate needs. */
export interface KnownRoom {
  /** Null where it is not a box. */
  size: RoomSize | null;
  volumeM3: number;
  surfaces: KnownSurface[];
  temperatureC: number;
  temperatureGuessed: boolean;
  speedOfSoundMPerS: number;
}

export type MissingMeasure = 'length' | 'width' | 'height' | 'volume' | 'surface';

/** Taken where nobody said: hard walls, so that the estimate is rather too long than too short. */
const guessedMaterialId = 'plaster';

/** @returns what the estimate needs, or the measures that are missing for it */
export function knownRoom(
  room: Pick<RoomResponse, 'shape' | 'surfaces' | 'temperatureC'>,
  usualTemperatureC: number,
): { known: KnownRoom } | { missing: MissingMeasure[] } {
  const { shape } = room;
  const missing = missingMeasures(shape);
  if (missing.length > 0) return { missing };
  const temperatureC = room.temperatureC ?? usualTemperatureC;
  const air = {
    temperatureC,
    temperatureGuessed: room.temperatureC === null,
    speedOfSoundMPerS: speedOfSoundMPerS(temperatureC),
  };
  if (shape.kind === 'other') {
    const surfaces = partsOf(null, shape.surfaceM2 ?? 0, room.surfaces);
    return { known: { size: null, volumeM3: shape.volumeM3 ?? 0, surfaces, ...air } };
  }
  const size = { lengthM: shape.lengthM ?? 0, widthM: shape.widthM ?? 0, heightM: shape.heightM ?? 0 };
  const surfaces = surfacePlaces.flatMap((place) =>
    partsOf(
      place,
      areaOf(place, size),
      room.surfaces.filter((surface) => surface.place === place),
    ),
  );
  return { known: { size, volumeM3: size.lengthM * size.widthM * size.heightM, surfaces, ...air } };
}

function missingMeasures(shape: RoomResponse['shape']): MissingMeasure[] {
  const measures: [MissingMeasure, number | null][] =
    shape.kind === 'box'
      ? [
          ['length', shape.lengthM],
          ['width', shape.widthM],
          ['height', shape.heightM],
        ]
      : [
          ['volume', shape.volumeM3],
          ['surface', shape.surfaceM2],
        ];
  return measures.filter(([, value]) => value === null).map(([name]) => name);
}

export function areaOf(place: SurfacePlace, { lengthM, widthM, heightM }: RoomSize): number {
  if (place === 'floor' || place === 'ceiling') return lengthM * widthM;
  return place === 'front' || place === 'back' ? lengthM * heightM : widthM * heightM;
}

/** Patches as large as there is room for, then what is said of all that's left, shared evenly. */
function partsOf(place: SurfacePlace | null, wholeM2: number, said: readonly RoomSurface[]): KnownSurface[] {
  let leftM2 = wholeM2;
  const patches = said.flatMap(({ materialId, areaM2 }) => {
    if (areaM2 === null) return [];
    const fits = Math.min(areaM2, leftM2);
    leftM2 -= fits;
    return fits > 0 ? [{ place, areaM2: fits, materialId, guessed: false }] : [];
  });
  if (leftM2 <= 0) return patches;
  const rest = said.filter(({ areaM2 }) => areaM2 === null);
  if (rest.length === 0)
    return [...patches, { place, areaM2: leftM2, materialId: guessedMaterialId, guessed: true }];
  return [
    ...patches,
    ...rest.map(({ materialId }) => ({
      place,
      areaM2: leftM2 / rest.length,
      materialId,
      guessed: false,
    })),
  ];
}
