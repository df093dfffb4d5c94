import { modeGroups, roomModes, type RoomMode } from '@thudline/dsp';
import type { KnownRoom } from './knownRoom';

/** Our choice: about as wide as a mode is that dies away in a second (2.2/T). */
const togetherWithinHz = 2;
/** The picture shows the lowest two octaves; above, they lie too close to be told apart. */
const shownOctaves = 2;
/** Of the low end, where a kick is; higher up, modes lying together are the rule. */
const boomBelowHz = 150;
/** "All modes" goes to the Schroeder frequency, but not on and on in a hall. */
const mostListed = 200;

export interface RoomResonances {
  /** In order of frequency. */
  all: RoomMode[];
  /** Where the picture ends. */
  shownToHz: number;
  /** Two or more that sound as one. */
  groups: RoomMode[][];
  /** The lowest group that has a mode along one direction: they are the strongest, and low ones stand out. */
  boom: RoomMode[] | null;
  /** What is shown first. */
  first: RoomMode;
}

/** The standing waves of a box; null where the room is none. */
export function roomResonances(
  { size, speedOfSoundMPerS }: KnownRoom,
  schroederHz: number | null,
): RoomResonances | null {
  if (!size) return null;
  const lowestHz = speedOfSoundMPerS / 2 / Math.max(size.lengthM, size.widthM, size.heightM);
  const shownToHz = lowestHz * 2 ** shownOctaves;
  const highestHz = Math.max(shownToHz, Math.min(schroederHz ?? 0, lowestHz * 10));
  const all = roomModes({ size, speedOfSoundMPerS, highestHz }).slice(0, mostListed);
  const groups = modeGroups(all, togetherWithinHz);
  const boom =
    groups.find((group) => group.some(isAxial) && group[0].frequencyHz <= Math.min(shownToHz, boomBelowHz)) ??
    null;
  return { all, shownToHz, groups, boom, first: boom?.find(isAxial) ?? all[0] };
}

const isAxial = ({ kind }: RoomMode) => kind === 'axial';

/** The middle of a group. */
export const meanHz = (group: readonly RoomMode[]): number =>
  group.reduce((sum, { frequencyHz }) => sum + frequencyHz, 0) / group.length;

export const modeKey = ({ order }: RoomMode): string => order.join('-');
