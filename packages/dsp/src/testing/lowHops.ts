import type { LowHops } from '../measurements/hits/kickCandidates';
import { createTrackPass } from '../measurements/pass/trackPass';

/** The low hops of both microphones, block by block, as the pass over a take hands them on. */
export function createLowHops(sampleRateHz: number): {
  push(kick: Float32Array, overhead: Float32Array): LowHops;
} {
  const [ofKick, ofOverhead] = [0, 1].map(() =>
    createTrackPass({ sampleRateHz, quantisationStep: null, frames: 1e9, listens: false }),
  );
  return {
    push: (kick, overhead) => ({ kick: ofKick.push(kick).low, overhead: ofOverhead.push(overhead).low }),
  };
}
