import { assertPositive, SignalError } from '../../assert';

/** Inside measures of a room with right angles. */
export interface RoomSize {
  readonly lengthM: number;
  readonly widthM: number;
  readonly heightM: number;
}

/** Between how many pairs of walls a mode stands: one, two or three. */
export type RoomModeKind = 'axial' | 'tangential' | 'oblique';

export interface RoomMode {
  /** Half waves along the length, the width and the height. */
  readonly order: readonly [alongLength: number, alongWidth: number, alongHeight: number];
  readonly frequencyHz: number;
  readonly kind: RoomModeKind;
}

export interface RoomModesOptions {
  readonly size: RoomSize;
  readonly speedOfSoundMPerS: number;
  /** Modes up to here, inclusive. */
  readonly highestHz: number;
}

/** More than any page shows, and few enough to list at once; our choice. */
const MOST_MODES = 20_000;

/**
 * Standing waves of a room with hard walls and right angles, f = (c/2)·√((p/L)² + (q/W)² + (r/H)²).
 *
 * An estimate: a real room has doors, slopes and walls that give.
 *
 * @returns in order of frequency; of modes at the same frequency, axial ones first
 * @throws {SignalError} `option` for a size, speed or limit that is not above 0, or that asks for more than 20,000 modes
 * @see Ballou (ed.), Handbook for Sound Engineers, 4th ed., chapter 6, whose Table 6-4 is among the tests
 * @example
 * const size = { lengthM: 5, widthM: 4, heightM: 2.5 };
 * roomModes({ size, speedOfSoundMPerS: 343.2, highestHz: 40 })[0].frequencyHz // 34.32
 */
export function roomModes({ size, speedOfSoundMPerS, highestHz }: RoomModesOptions): RoomMode[] {
  assertRoomSize(size);
  assertPositive(speedOfSoundMPerS, 'speedOfSoundMPerS');
  assertPositive(highestHz, 'highestHz');
  const perHalfWave = [size.lengthM, size.widthM, size.heightM].map(
    (metres) => speedOfSoundMPerS / 2 / metres,
  );
  const most = perHalfWave.map((hz) => Math.floor(highestHz / hz));
  // An eighth of an ellipsoid lies inside a box of 6/π times its size.
  if ((most[0] + 1) * (most[1] + 1) * (most[2] + 1) > 2 * MOST_MODES)
    throw new SignalError('option', `A room of this size has more than ${MOST_MODES} modes up to there.`);
  const modes: RoomMode[] = [];
  for (let p = 0; p <= most[0]; p += 1)
    for (let q = 0; q <= most[1]; q += 1)
      for (let r = 0; r <= most[2]; r += 1) {
        const frequencyHz = Math.hypot(p * perHalfWave[0], q * perHalfWave[1], r * perHalfWave[2]);
        if (frequencyHz > 0 && frequencyHz <= highestHz)
          modes.push({ order: [p, q, r], frequencyHz, kind: kindOf([p, q, r]) });
      }
  return modes.sort((a, b) => a.frequencyHz - b.frequencyHz || kinds.indexOf(a.kind) - kinds.indexOf(b.kind));
}

/** @throws {SignalError} `option` for a measure that is not above 0 */
export function assertRoomSize({ lengthM, widthM, heightM }: RoomSize): void {
  assertPositive(lengthM, 'lengthM');
  assertPositive(widthM, 'widthM');
  assertPositive(heightM, 'heightM');
}

const kinds: readonly RoomModeKind[] = ['axial', 'tangential', 'oblique'];

function kindOf(order: readonly number[]): RoomModeKind {
  return kinds[order.filter((halfWaves) => halfWaves > 0).length - 1];
}
