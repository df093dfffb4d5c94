import type { TrackSource } from '../../trackSource';
import { hum } from '../level/hum';
import { createTrackPass, type PassedTrack, type TrackHops } from './trackPass';

/** A pass over one track on its way. */
export interface TrackReading {
  /** @returns the hops of the next block, good until the next call; null at the end */
  next(): Promise<TrackHops | null>;
  /** Once everything was read. */
  result(): Promise<PassedTrack>;
  /** Ends it, also before everything was read. */
  close(): Promise<void>;
}

export interface ReadTrackOptions {
  /** How many samples are looked at: those of the shortest track. */
  readonly frames: number;
  readonly listens: boolean;
}

/** Passes over a track, block by block as it is asked for. */
export function readTrack(source: TrackSource, { frames, listens }: ReadTrackOptions): TrackReading {
  const { sampleRateHz, quantisationStep } = source;
  const pass = createTrackPass({ sampleRateHz, quantisationStep, frames, listens });
  const blocks = source.blocks()[Symbol.asyncIterator]();
  let left = frames;
  return {
    async next() {
      if (left <= 0) return null;
      const read = await blocks.next();
      if (read.done) return null;
      const block = read.value.subarray(0, left);
      left -= block.length;
      return pass.push(block);
    },
    async result() {
      const { level, outline } = pass.result();
      const quiet = pass.quietStretch();
      const heard = quiet && hum(await source.read(quiet.startFrame, quiet.endFrame), sampleRateHz);
      return { level: { ...level, hum: heard }, outline };
    },
    async close() {
      await blocks.return?.();
    },
  };
}
