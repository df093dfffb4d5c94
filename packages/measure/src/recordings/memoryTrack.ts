import type { TrackSource } from '@thudline/dsp';

const BLOCK = 65_536;

/** A track held in memory; what lies outside is silence. */
export function memoryTrack(samples: Float32Array, sampleRateHz: number): TrackSource {
  return {
    sampleRateHz,
    frames: samples.length,
    quantisationStep: null,
    async *blocks() {
      for (let start = 0; start < samples.length; start += BLOCK) {
        await Promise.resolve();
        yield samples.slice(start, start + BLOCK);
      }
    },
    read(startFrame, endFrame) {
      const part = new Float32Array(endFrame - startFrame);
      const from = Math.max(0, startFrame);
      const to = Math.max(from, Math.min(samples.length, endFrame));
      part.set(samples.subarray(from, to), from - startFrame);
      return Promise.resolve(part);
    },
  };
}
