import type { TrackSource } from '../trackSource';
import { lockstep } from './lockstep';

/** @returns whether two tracks hold the same samples, as far as the shorter one goes */
export async function sameSamples(a: TrackSource, b: TrackSource): Promise<boolean> {
  for await (const [one, other] of lockstep([a, b])) {
    for (let i = 0; i < one.length; i += 1) if (one[i] !== other[i]) return false;
  }
  return true;
}
