import { assertPositive } from '../../assert';
import type { RoomMode } from './roomModes';

/**
 * Modes that lie so close that they sound as one, and louder than one.
 *
 * @param modes - in order of frequency, as `roomModes` returns them
 * @param withinHz - each is at most this far from its neighbour
 * @returns groups of two and more, in order of frequency
 * @throws {SignalError} `option` for a distance that is not above 0
 * @see Everest, The Master Handbook of Acoustics, 4th ed., on degenerate modes; how close is the caller's choice
 * @example
 * const size = { lengthM: 5, widthM: 5, heightM: 2.5 };
 * const modes = roomModes({ size, speedOfSoundMPerS: 343.2, highestHz: 40 });
 * modeGroups(modes, 2).length // 1
 */
export function modeGroups(modes: readonly RoomMode[], withinHz: number): RoomMode[][] {
  assertPositive(withinHz, 'withinHz');
  const groups: RoomMode[][] = [];
  modes.forEach((mode, i) => {
    const near = i > 0 && mode.frequencyHz - modes[i - 1].frequencyHz <= withinHz;
    if (near) groups[groups.length - 1].push(mode);
    else groups.push([mode]);
  });
  return groups.filter((group) => group.length > 1);
}
