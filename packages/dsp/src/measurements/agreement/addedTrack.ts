import { assertPositive, SignalError } from '../../assert';
import { dbAmplitude } from '../../decibel';
import type { Choice } from '../../facts';
import type { TrackSource } from '../../trackSource';
import { shiftedSamples, shiftReachSamples } from './shiftedSamples';

/** Added at a time: 256 kB of samples from each microphone. */
const blockFrames = 65_536;

/**
 * The two microphones added with a choice, as one track that is made while it is read: memory doesn't grow with its length.
 *
 * It is as long as the longer of the two; a shifted overhead is silent where it has nothing yet, or nothing more.
 *
 * @param kick - as it is
 * @param overhead - of the same rate; flipped, played earlier and louder as the choice says
 * @returns full scale ±1, and beyond where the two add up to more
 * @throws {SignalError} `option` for different rates, or a choice that is no number
 * @example
 * const added = addedTrack(file.track(0), file.track(1), { flipped: true, shiftMs: 2, gainDb: 0 });
 * added.frames // 216000
 */
export function addedTrack(kick: TrackSource, overhead: TrackSource, choice: Choice): TrackSource {
  const { sampleRateHz } = kick;
  assertPositive(sampleRateHz, 'sampleRateHz');
  if (overhead.sampleRateHz !== sampleRateHz) {
    throw new SignalError('option', 'Two microphones that are added have one sample rate.');
  }
  const shift = (choice.shiftMs / 1000) * sampleRateHz;
  const gain = dbAmplitude(choice.gainDb) * (choice.flipped ? -1 : 1);
  if (!Number.isFinite(shift) || !Number.isFinite(gain)) {
    throw new SignalError('option', 'A choice has a finite shift and a finite gain.');
  }
  const whole = Math.floor(shift);
  const frames = Math.max(kick.frames, overhead.frames);

  const read = async (start: number, end: number): Promise<Float32Array> => {
    const added = (await kick.read(start, end)).slice();
    const around = await overhead.read(start + whole - shiftReachSamples, end + whole + shiftReachSamples);
    const shifted = shiftedSamples(around, shift - whole);
    for (let i = 0; i < added.length; i += 1) added[i] += gain * shifted[i + shiftReachSamples];
    return added;
  };
  return {
    sampleRateHz,
    frames,
    quantisationStep: null,
    read,
    async *blocks() {
      for (let start = 0; start < frames; start += blockFrames) {
        yield await read(start, Math.min(start + blockFrames, frames));
      }
    },
  };
}
