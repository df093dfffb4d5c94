import type { LowHops } from '../../measurements/hits/kickCandidates';
import { createLowHops } from '../lowHops';
import type { SmallKit } from '../smallKit';

const BLOCK = 8192;

/** Hands a made take on as the pass over it does, block by block. */
export function eachLowBand(
  { kick, overhead, sampleRateHz }: Pick<SmallKit, 'kick' | 'overhead' | 'sampleRateHz'>,
  take: (low: LowHops) => void,
): void {
  const hops = createLowHops(sampleRateHz);
  for (let start = 0; start < kick.length; start += BLOCK) {
    take(hops.push(kick.subarray(start, start + BLOCK), overhead.subarray(start, start + BLOCK)));
  }
}
