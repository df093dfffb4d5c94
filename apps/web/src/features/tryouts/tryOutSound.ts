import { paths } from '@thudline/contracts';
import { bytesSource, openWav } from '@thudline/dsp';
import { requestBytes } from '../../lib/apiClient';
import type { TakeSound } from '../../lib/audio/matchedTakes';
import type { HeardPlace } from './hearing';

/** 16 bits of two microphones a frame, and room for a header. */
const frameBytes = 4;
const headerBytes = 128;

/** Reads what is heard of one take; a flipped overhead comes turned over. */
export async function loadHeardPlace(
  { takeId, sampleRateHz, zeroS, endS, flipped }: HeardPlace,
  signal: AbortSignal,
): Promise<TakeSound> {
  const firstBytes = headerBytes + Math.ceil(endS * sampleRateHz) * frameBytes;
  const { bytes } = await requestBytes(paths.listen(takeId), { signal, firstBytes });
  const file = await openWav(bytesSource(bytes));
  const read = (channel: number) => {
    const track = file.track(channel);
    const begin = Math.min(track.frames, Math.round(zeroS * sampleRateHz));
    return track.read(begin, Math.min(track.frames, Math.round(endS * sampleRateHz)));
  };
  const [kick, overhead] = [await read(0), await read(1)];
  return { sampleRateHz, kick, overhead: flipped ? overhead.map((sample) => -sample) : overhead };
}
