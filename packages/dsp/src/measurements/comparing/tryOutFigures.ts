import type { Choice, HitFacts, PairSpectrum } from '../../facts';
import { bandEnergies, lowEnd, ratioDb } from '../agreement/choiceEnergy';
import { interquartileRange, median } from '../statistics';

/**
 * Low end that the overhead brings: the two added at a choice against the kick microphone alone, 30–150 Hz.
 *
 * @returns dB, above 0 where there is more than without the overhead; null for a silent kick microphone
 * @example
 * lowEndOverKickDb(spectrum, { flipped: true, shiftMs: 2, gainDb: 7.96 }) // 6.02
 */
export function lowEndOverKickDb(spectrum: PairSpectrum, choice: Choice): number | null {
  const { added } = bandEnergies(spectrum, choice, lowEnd);
  const { powerSum: kickAlone } = bandEnergies(spectrum, { ...choice, gainDb: -Infinity }, lowEnd);
  return ratioDb(added, kickAlone);
}

/**
 * Bleed in the kick microphone: its median peak at drum hits without a kick against that at kick hits.
 *
 * @param kick - the kick microphone's place in `peaksDbfs`
 * @returns dB, the lower the less bleed; null without hits of either kind
 * @example
 * const hits = [{ timeS: 0, kind: 'kick', peaksDbfs: [-9, -20] }, { timeS: 1, kind: 'drum', peaksDbfs: [-33, -12] }];
 * bleedDb(hits, 0) // -24
 */
export function bleedDb(hits: readonly HitFacts[], kick: number): number | null {
  const peaks = (kind: HitFacts['kind']): number[] =>
    hits.filter((hit) => hit.kind === kind).flatMap((hit) => hit.peaksDbfs[kick] ?? []);
  const drums = median(peaks('drum'));
  const kicks = median(peaks('kick'));
  return drums === null || kicks === null ? null : drums - kicks;
}

/**
 * Evenness of the playing: interquartile range of the kick-file peaks at kick hits.
 *
 * @returns dB, the lower the more even; null below two kick hits
 * @example
 * evennessDb(facts.hits, 0) // 0
 */
export function evennessDb(hits: readonly HitFacts[], kick: number): number | null {
  return interquartileRange(
    hits.filter((hit) => hit.kind === 'kick').flatMap((hit) => hit.peaksDbfs[kick] ?? []),
  );
}
