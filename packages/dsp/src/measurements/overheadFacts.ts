import type { BalanceFacts, HitFacts } from '../facts';
import type { TrackSource } from '../trackSource';
import { balance } from './balance/balance';

/** What is told from the overhead's own hits, once all hits of the take are known. */
export interface OverheadFacts {
  readonly balance: BalanceFacts;
}

/** Reads the overhead again around the hits that tell something. */
export async function overheadFacts(
  overhead: TrackSource,
  hits: readonly HitFacts[],
): Promise<OverheadFacts> {
  return { balance: await balance(overhead, hits) };
}
