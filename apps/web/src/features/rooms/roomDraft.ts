import type { CreateRoomRequest, RoomResponse, RoomSurface, UserSettings } from '@thudline/contracts';
import { numberOf } from './components/NumberField';

type Units = Pick<UserSettings, 'lengthUnit' | 'temperatureUnit'>;

export const surfacePlaces = ['floor', 'ceiling', 'front', 'back', 'left', 'right'] as const;
export type SurfacePlace = (typeof surfacePlaces)[number];

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
  /** Of each whole side; empty where nothing is said. */
  materials: Record<SurfacePlace, string>;
  kitX: string;
  kitY: string;
  kitTurned: string;
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
    kitX: written(room?.kit?.xM, m),
    kitY: written(room?.kit?.yM, m),
    kitTurned: written(room?.kit?.turnedDeg),
  };
}

/** @param kept - patches of a side, which this draft doesn't touch. @returns null where something isn't a number */
export function roomRequest(
  draft: RoomDraft,
  units: Units,
  kept: readonly RoomSurface[] = [],
): Required<CreateRoomRequest> | null {
  const m = perMetre(units);
  const numbers = [draft.length, draft.width, draft.height, draft.volume, draft.surface, draft.temperature];
  if ([...numbers, draft.kitX, draft.kitY, draft.kitTurned].some((text) => Number.isNaN(numberOf(text) ?? 0)))
    return null;
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
      ...kept.filter(({ areaM2 }) => areaM2 !== null),
    ],
    temperatureC:
      temperature === null || units.temperatureUnit === 'celsius' ? temperature : (temperature - 32) / 1.8,
    kit: xM === null || yM === null ? null : { xM, yM, turnedDeg: read(draft.kitTurned) ?? 0 },
  };
}
