import type { HitFacts } from '../../facts';
import { median } from '../statistics';

/**
 * What the overhead is turned up by for "levels matched".
 *
 * The smaller of: the kick file's median peak over the overhead's at kick hits, and the same over the overhead's at drum
 * hits. Never the take's peak, since one crash would halve the figure.
 *
 * @param hits - all hits of the take; `a` is the kick microphone's place in `peaksDbfs`, `b` the overhead's
 * @returns dB; null without kick hits or with a silent microphone
 */
export function matchGainDb(
  hits: readonly HitFacts[],
  { a, b }: { readonly a: number; readonly b: number },
): number | null {
  const kicks = hits.filter((hit) => hit.kind === 'kick');
  const drums = hits.filter((hit) => hit.kind === 'drum');
  const kickDbfs = medianPeak(kicks, a);
  const overheadDbfs = medianPeak(kicks, b);
  if (kickDbfs === null || overheadDbfs === null) return null;
  const drumDbfs = medianPeak(drums, b) ?? -Infinity;
  return kickDbfs - Math.max(overheadDbfs, drumDbfs);
}

function medianPeak(hits: readonly HitFacts[], track: number): number | null {
  return median(hits.flatMap((hit) => hit.peaksDbfs[track] ?? []));
}
