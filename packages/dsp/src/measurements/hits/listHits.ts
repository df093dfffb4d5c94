import { amplitudeDb } from '../../decibel';
import type { HitFacts, KickHitFigures } from '../../facts';
import type { OverheadHit } from './overheadHits';

/** A kick hit with the largest |x| of each track around it. */
export interface KickHit {
  readonly onsetSample: number;
  readonly startSample: number;
  readonly peaks: readonly number[];
  /** Only in a take with an overhead. */
  readonly figures?: KickHitFigures;
}

/** What the overhead hears within this of a kick's onset is that kick, or something struck with it. */
const SAME_INSTANT_MS = 40;
/**
 * Two modes of one shell beat, so a kick swells again: seen 45–110 ms after it, on one of two real kits and on synthetic
 * ones. What no stick struck, and what is nowhere louder than the kick, is that within this time of it.
 */
const RINGING_WITHIN_MS = 150;

export interface ListHitsOptions {
  readonly sampleRateHz: number;
  /** How much later the overhead's file runs than the kick's; 0 where they start together. */
  readonly lateSamples?: number;
}

/**
 * One list of what was struck, in order of time; a kick with something else on the same instant is told as a kick.
 *
 * Kicks are told at their place in the kick's file, what the overhead alone hears at its place in the overhead's.
 */
export function listHits(
  kicks: readonly KickHit[],
  others: readonly OverheadHit[],
  { sampleRateHz, lateSamples = 0 }: ListHitsOptions,
): HitFacts[] {
  const near = (SAME_INSTANT_MS / 1000) * sampleRateHz;
  const ringing = (RINGING_WITHIN_MS / 1000) * sampleRateHz;
  let next = 0;
  const alone = others.filter((hit) => {
    const at = hit.atSample - lateSamples;
    while (next < kicks.length && kicks[next].onsetSample < at - near) next += 1;
    if (next < kicks.length && kicks[next].onsetSample <= at + near) return false;
    const before = next > 0 ? kicks[next - 1] : null;
    return !before || at - before.onsetSample > ringing || !isRinging(hit, before);
  });
  const told = (sample: number, kind: HitFacts['kind'], peaks: readonly number[]): HitFacts => ({
    timeS: sample / sampleRateHz,
    kind,
    peaksDbfs: peaks.map(amplitudeDb),
  });
  return [
    ...kicks.map(({ startSample, peaks, figures }) => ({
      ...told(startSample, 'kick', peaks),
      ...(figures && { kickFigures: figures }),
    })),
    ...alone.map((hit) => told(hit.atSample, hit.kind, hit.peaks)),
  ].sort((a, b) => a.timeS - b.timeS);
}

function isRinging(hit: OverheadHit, of: KickHit): boolean {
  return !hit.struck && hit.peaks.every((peak, track) => peak <= of.peaks[track]);
}

/** @returns the largest peak of one track at any hit; null without hits */
export function loudestHitDbfs(hits: readonly HitFacts[], track: number): number | null {
  return hits.reduce<number | null>((loudest, hit) => {
    const peak = hit.peaksDbfs[track] ?? null;
    return peak !== null && (loudest === null || peak > loudest) ? peak : loudest;
  }, null);
}
