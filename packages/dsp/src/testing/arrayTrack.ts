import type { TrackSource } from '../trackSource';

/** A track held in memory, cut into blocks of an odd size so that nothing can count on round ones. */
export function arrayTrack(samples: Float32Array, sampleRateHz: number, blockSize = 10007): TrackSource {
  return {
    sampleRateHz,
    frames: samples.length,
    quantisationStep: null,
    async *blocks() {
      for (let start = 0; start < samples.length; start += blockSize) {
        await Promise.resolve();
        yield samples.subarray(start, start + blockSize);
      }
    },
    read(startFrame, endFrame) {
      const part = new Float32Array(endFrame - startFrame);
      for (let i = Math.max(0, startFrame); i < Math.min(endFrame, samples.length); i += 1) {
        part[i - startFrame] = samples[i];
      }
      return Promise.resolve(part);
    },
  };
}
