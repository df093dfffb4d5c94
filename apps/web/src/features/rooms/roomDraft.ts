import type { CreateRoomRequest, RoomResponse, UserSettings } from '@thudline/contracts';
import { numberOf } from './components/NumberField';

type Units = Pick<UserSettings, 'lengthUnit' | 'temperatureUnit'>;

export const surfacePlaces = ['floor', 'ceiling', 'front', 'back', 'left', 'right'] as const;
export type SurfacePlace = (typeof surfacePlaces)[number];

/** A part of a side that is made of something else. */
export interface DraftPatch {
  place: SurfacePlace;
  materialId: string;
  area: string;
}

/** What is typed about a room, in the reader's units. */
export interface RoomDraft {
  name: string;
  isBox: boolean;
  length: string;
  width: string;
  height: string;
  volume: string;
  surface: string;
  temperature: string;
  /** Of all that's left of each side; empty where nothing is said. */
  materials: Record<SurfacePlace, string>;
  patches: DraftPatch[];
  kitX: string;
  kitY: string;
  kitTurned: string;
}

/** What each part of the form gets. */
export interface RoomPartProps {
  draft: RoomDraft;
  settings: UserSettings;
  set: (change: Partial<RoomDraft>) => void;
}

const feetInAMetre = 3.28084;
const perMetre = ({ lengthUnit }: Units) => (lengthUnit === 'metre' ? 1 : feetInAMetre);
const written = (value: number | null | undefined, factor = 1) =>
  value == null ? '' : String(Number((value * factor).toFixed(2)));
const read = (text: string, factor = 1) => {
  const value = numberOf(text);
  return value === null ? null : value / factor;
};

const noMaterials: Record<SurfacePlace, string> = {
  floor: '',
  ceiling: '',
  front: '',
  back: '',
  left: '',
  right: '',
};

export function draftOf(room: RoomResponse | null, units: Units): RoomDraft {
  const m = perMetre(units);
  const box = room?.shape.kind === 'box' ? room.shape : null;
  const other = room?.shape.kind === 'other' ? room.shape : null;
  const whole = (room?.surfaces ?? []).filter(({ areaM2 }) => areaM2 === null);
  const { temperatureUnit } = units;
  const celsius = room?.temperatureC ?? null;
  return {
    name: room?.name ?? '',
    isBox: !other,
    length: written(box?.lengthM, m),
    width: written(box?.widthM, m),
    height: written(box?.heightM, m),
    volume: written(other?.volumeM3, m ** 3),
    surface: written(other?.surfaceM2, m ** 2),
    temperature: written(celsius === null || temperatureUnit === 'celsius' ? celsius : celsius * 1.8 + 32),
    materials: { ...noMaterials, ...Object.fromEntries(whole.map((s) => [s.place, s.materialId])) },
    patches: (room?.surfaces ?? []).flatMap(({ place, materialId, areaM2 }) =>
      areaM2 === null ? [] : [{ place, materialId, area: written(areaM2, m ** 2) }],
    ),
    kitX: written(room?.kit?.xM, m),
    kitY: written(room?.kit?.yM, m),
    kitTurned: written(room?.kit?.turnedDeg),
  };
}

/** @returns null where something isn't a number; a patch without an area isn't there */
export function roomRequest(draft: RoomDraft, units: Units): Required<CreateRoomRequest> | null {
  const m = perMetre(units);
  const numbers = [draft.length, draft.width, draft.height, draft.volume, draft.surface, draft.temperature];
  const others = [draft.kitX, draft.kitY, draft.kitTurned, ...draft.patches.map(({ area }) => area)];
  if ([...numbers, ...others].some((text) => Number.isNaN(numberOf(text) ?? 0))) return null;
  const temperature = read(draft.temperature);
  const [xM, yM] = [read(draft.kitX, m), read(draft.kitY, m)];
  return {
    name: draft.name,
    shape: draft.isBox
      ? {
          kind: 'box',
          lengthM: read(draft.length, m),
          widthM: read(draft.width, m),
          heightM: read(draft.height, m),
        }
      : { kind: 'other', volumeM3: read(draft.volume, m ** 3), surfaceM2: read(draft.surface, m ** 2) },
    surfaces: [
      ...surfacePlaces.flatMap((place) =>
        draft.materials[place] ? { place, materialId: draft.materials[place], areaM2: null } : [],
      ),
      ...draft.patches.flatMap(({ place, materialId, area }) => {
        const areaM2 = read(area, m ** 2);
        return areaM2 === null ? [] : [{ place, materialId, areaM2 }];
      }),
    ],
    temperatureC:
      temperature === null || units.temperatureUnit === 'celsius' ? temperature : (temperature - 32) / 1.8,
    kit: xM === null || yM === null ? null : { xM, yM, turnedDeg: read(draft.kitTurned) ?? 0 },
  };
}

/** The box that is typed so far, in metres; null while its length or its width is missing. */
export function draftShape(draft: RoomDraft, units: Units): RoomResponse['shape'] | null {
  const shape = roomRequest({ ...draft, patches: [] }, units)?.shape;
  return shape?.kind === 'box' && (shape.lengthM ?? 0) > 0 && (shape.widthM ?? 0) > 0 ? shape : null;
}

/** A place of the kit in metres; null while there is none. */
export function draftKit({ kitX, kitY, kitTurned }: RoomDraft, units: Units): RoomResponse['kit'] {
  const m = perMetre(units);
  const [xM, yM, turnedDeg] = [read(kitX, m), read(kitY, m), read(kitTurned)];
  return xM === null || yM === null || !Number.isFinite(xM + yM)
    ? null
    : { xM, yM, turnedDeg: Number.isFinite(turnedDeg ?? 0) ? (turnedDeg ?? 0) : 0 };
}

/** The kit's place as it is typed, in the reader's unit. */
export const kitFields = (kit: { xM: number; yM: number } | null, units: Units) => ({
  kitX: written(kit?.xM, perMetre(units)),
  kitY: written(kit?.yM, perMetre(units)),
});
