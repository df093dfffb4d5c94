import type { BalanceFacts, HitFacts, RoomFacts } from '../facts';
import type { TrackSource } from '../trackSource';
import { balance } from './balance/balance';
import { roomDecay } from './decay/roomDecay';

/** What is told from the overhead's own hits, once all hits of the take are known. */
export interface OverheadFacts {
  readonly balance: BalanceFacts;
  readonly room: RoomFacts;
}

/**
 * Reads the overhead again around the hits that tell something.
 *
 * @param options.place - the overhead's in the hits' peaks
 */
export async function overheadFacts(
  overhead: TrackSource,
  options: { readonly hits: readonly HitFacts[]; readonly place: number },
): Promise<OverheadFacts> {
  return { balance: await balance(overhead, options.hits), room: await roomDecay(overhead, options) };
}
