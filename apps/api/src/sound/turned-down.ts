import { dbAmplitude, TrackSource } from '@thudline/dsp';

/** The same track at another level; nothing is stored. */
export function turnedDown(track: TrackSource, gainDb: number): TrackSource {
  const gain = dbAmplitude(gainDb);
  const scaled = (samples: Float32Array) => samples.map((sample) => sample * gain);
  return {
    ...track,
    read: async (start, end) => scaled(await track.read(start, end)),
    async *blocks() {
      for await (const block of track.blocks()) yield scaled(block);
    },
  };
}
