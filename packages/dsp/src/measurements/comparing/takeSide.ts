import { SignalError } from '../../assert';
import type { HitFacts, KickHitFigures, PairFacts, TakeFacts } from '../../facts';

/** A kick hit with what it says alone. */
export interface KickHitTold {
  readonly peakDbfs: number;
  readonly figures: KickHitFigures;
}

/** One of the takes that are compared: its first pair. */
export interface TakeSide {
  readonly facts: TakeFacts;
  readonly pair: PairFacts;
  /** False in facts measured before each hit was kept. */
  readonly hitsKept: boolean;
  readonly kicks: readonly KickHitTold[];
}

/** @throws {SignalError} `option` for a take without a pair of microphones */
export function takeSide(facts: TakeFacts): TakeSide {
  const pair = facts.pairs[0];
  if (!pair) throw new SignalError('option', 'Only takes with a kick microphone and an overhead compare.');
  const kickHits = facts.hits.filter((hit) => hit.kind === 'kick');
  const kicks = kickHits.flatMap((hit) => kickHitTold(hit, pair.a));
  return { facts, pair, kicks, hitsKept: kickHits.every((hit) => hit.kickFigures) };
}

function kickHitTold({ kickFigures, peaksDbfs }: HitFacts, kick: number): KickHitTold[] {
  const peakDbfs = peaksDbfs[kick] ?? null;
  return kickFigures && peakDbfs !== null ? [{ peakDbfs, figures: kickFigures }] : [];
}

/** Σ over hits of the low end's energies. */
export function lowEnergySums(hits: readonly KickHitTold[]): KickHitFigures['lowEnergy'] {
  const sums = { kick: 0, overhead: 0, cross: 0 };
  for (const { figures } of hits) {
    sums.kick += figures.lowEnergy.kick;
    sums.overhead += figures.lowEnergy.overhead;
    sums.cross += figures.lowEnergy.cross;
  }
  return sums;
}

/** Which way the two microphones push at the kick, over all hits. */
export function lowEndSign(side: TakeSide): number {
  return Math.sign(lowEnergySums(side.kicks).cross);
}
