import { paths } from '@thudline/contracts';
import { openWav } from '@thudline/dsp';
import type { TakeSound } from '../../lib/audio/matchedTakes';
import { rangedSource } from '../../lib/rangedSource';

interface SoundStretch {
  takeId: string;
  /** Of the take; before its beginning there is silence. */
  startS: number;
  /** Exclusive; cut at the end of the take. */
  endS: number;
}

/** Reads one stretch of a take's sound, and nothing else of it. */
export async function loadTakeSound(
  { takeId, startS, endS }: SoundStretch,
  signal: AbortSignal,
): Promise<TakeSound> {
  const file = await openWav(await rangedSource(paths.listen(takeId), signal));
  const { sampleRateHz } = file.facts;
  const read = (channel: number) => {
    const track = file.track(channel);
    const begin = Math.min(track.frames, Math.round(startS * sampleRateHz));
    return track.read(begin, Math.min(track.frames, Math.round(endS * sampleRateHz)));
  };
  return { sampleRateHz, kick: await read(0), overhead: await read(1) };
}
