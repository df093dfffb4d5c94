import type { AddedFileResponse } from '@thudline/contracts';
import type { Choice } from '@thudline/dsp';
import { bytes, decibels, number } from '../../lib/format';

/** Half of what is shown: less than this reads as none. */
const leastShiftMs = 0.005;
const leastGainDb = 0.05;

/** "overhead flipped, 1.60 ms earlier, 5.7 dB louder": every part that changes something. */
export function addedChoiceWords({ flipped, shiftMs, gainDb }: Choice): string {
  const parts = [
    flipped ? 'overhead flipped' : 'overhead not flipped',
    Math.abs(shiftMs) >= leastShiftMs &&
      `${number(Math.abs(shiftMs), 2)} ms ${shiftMs > 0 ? 'earlier' : 'later'}`,
    Math.abs(gainDb) >= leastGainDb && `${decibels(Math.abs(gainDb))} ${gainDb > 0 ? 'louder' : 'quieter'}`,
  ];
  return parts.filter(Boolean).join(', ');
}

/** What an added file is, and what was done to its level. */
export function addedFileFacts({ bytes: size, levelDb }: NonNullable<AddedFileResponse['file']>): string {
  const down =
    levelDb <= -leastGainDb
      ? `turned down ${decibels(-levelDb)} so that no peak goes beyond −1 dBTP`
      : 'at the level the two add up to';
  return `24-bit WAV, ${bytes(size)}, ${down}.`;
}

/** Two choices that read alike on the sheet are one file; the server rounds finer. */
export const isSameChoice = (a: Choice, b: Choice) =>
  a.flipped === b.flipped &&
  Math.abs(a.shiftMs - b.shiftMs) < 0.0006 &&
  Math.abs(a.gainDb - b.gainDb) < 0.006;
