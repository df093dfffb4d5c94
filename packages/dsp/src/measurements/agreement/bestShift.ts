import type { ArrivalFacts, Choice, PairSpectrum } from '../../facts';
import { choiceLowEnd } from './choiceLevels';
import { thirdOctaves } from './thirdOctaves';

/** Third-octaves 31.5–800 Hz; a search on the low band alone ran to its edge on every real case (measurements.md, 5). */
const judged = thirdOctaves.filter((band) => band.centreHz > 30 && band.centreHz < 900);
/** docs/measurements.md, 5: from 0 to this much beyond the arrival. */
const BEYOND_ARRIVAL_MS = 1.5;
const WORTH_DB = 0.5;
/** Our choice: from here on an arrival is called confident. */
const CONFIDENT = 0.5;
const STEP_MS = 0.02;

/**
 * The shift, with either polarity, at which the two microphones add best over the third-octaves from 31.5 to 800 Hz.
 *
 * @returns null at an edge of the range, without a confident arrival, or where it isn't worth 0.5 dB over the better
 *   unshifted polarity
 */
export function bestShift(
  spectrum: PairSpectrum,
  { arrival, gainDb }: { readonly arrival: ArrivalFacts; readonly gainDb: number },
): Choice | null {
  if (arrival.arrivalMs === null || arrival.confidence < CONFIDENT) return null;
  const steps = Math.floor((arrival.arrivalMs + BEYOND_ARRIVAL_MS) / STEP_MS);
  let best: { score: number; step: number; choice: Choice } | null = null;
  let unshifted = -Infinity;
  for (const flipped of [false, true]) {
    for (let step = 0; step <= steps; step += 1) {
      const choice = { flipped, gainDb, shiftMs: step * STEP_MS };
      const score = meanLevel(spectrum, choice);
      if (step === 0) unshifted = Math.max(unshifted, score);
      if (!best || score > best.score) best = { score, step, choice };
    }
  }
  if (!best || best.step === 0 || best.step === steps) return null;
  return best.score - unshifted < WORTH_DB ? null : best.choice;
}

function meanLevel(spectrum: PairSpectrum, choice: Choice): number {
  const levels = judged.flatMap((band) => choiceLowEnd(spectrum, choice, band) ?? []);
  return levels.reduce((sum, level) => sum + level, 0) / Math.max(1, levels.length);
}
