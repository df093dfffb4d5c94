import { assertPositive } from '../../assert';
import type { Choice, HitFacts, PairSpectrum } from '../../facts';
import { bandEnergies, lowEnd, ratioDb } from '../agreement/choiceEnergy';
import { butterworthBand } from '../filters/butterworth';
import { filtered } from '../filters/filterChain';
import { interquartileRange, median } from '../statistics';

/** The beater's click against the drum's weight (section 8). */
const CLICK_BAND = { lowHz: 2000, highHz: 6000 };
const CLICK_S = 0.02;
const WEIGHT_BAND = { lowHz: 40, highHz: 150 };
const WEIGHT_S = 0.2;

/**
 * Low end that the overhead brings: the two added at a choice against the kick microphone alone, 30–150 Hz.
 *
 * @returns dB, above 0 where there is more than without the overhead; null for a silent kick microphone
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
 */
export function evennessDb(hits: readonly HitFacts[], kick: number): number | null {
  return interquartileRange(
    hits.filter((hit) => hit.kind === 'kick').flatMap((hit) => hit.peaksDbfs[kick] ?? []),
  );
}

/**
 * Attack of one kick hit: 2–6 kHz energy of its first 20 ms against 40–150 Hz energy of its first 200 ms.
 *
 * @param samples - the kick microphone, from some milliseconds before the hit to at least 200 ms after
 * @param options.startAt - index of the hit's first sound
 * @returns dB, the higher the more click; null where either band is silent or the hit is cut off
 * @throws {SignalError} `option` for a rate that can't be
 */
export function attackDb(
  samples: Float32Array,
  { sampleRateHz, startAt }: { readonly sampleRateHz: number; readonly startAt: number },
): number | null {
  assertPositive(sampleRateHz, 'sampleRateHz');
  const energy = (band: { lowHz: number; highHz: number }, lengthS: number): number => {
    const end = startAt + Math.round(lengthS * sampleRateHz);
    const inBand = filtered(samples, butterworthBand({ sampleRateHz, ...band }));
    return inBand.subarray(startAt, end).reduce((sum, x) => sum + x * x, 0);
  };
  if (startAt < 0 || startAt + Math.round(WEIGHT_S * sampleRateHz) > samples.length) return null;
  return ratioDb(energy(CLICK_BAND, CLICK_S), energy(WEIGHT_BAND, WEIGHT_S));
}
