import { paths } from '@thudline/contracts';
import { bytesSource, openWav } from '@thudline/dsp';
import { requestBytes } from '../../lib/apiClient';
import type { TakeSound } from '../../lib/audio/matchedTakes';

/** Longer takes are heard from their beginning up to here: everything is held in memory, so that switching is exact. */
export const heardS = 180;

/** 16 bits of two microphones a frame, and room for a header. */
const frameBytes = 4;
const headerBytes = 128;

/** Reads a take's sound, as much of it as is heard. */
export async function loadTakeSound(
  { takeId, sampleRateHz, durationS }: { takeId: string; sampleRateHz: number; durationS: number },
  signal: AbortSignal,
): Promise<TakeSound> {
  const firstBytes =
    durationS > heardS ? headerBytes + Math.ceil(heardS * sampleRateHz) * frameBytes : undefined;
  const { bytes } = await requestBytes(paths.listen(takeId), { signal, firstBytes });
  const file = await openWav(bytesSource(bytes));
  const read = async (channel: number) => {
    const track = file.track(channel);
    return track.read(0, track.frames);
  };
  return { sampleRateHz, kick: await read(0), overhead: await read(1) };
}
