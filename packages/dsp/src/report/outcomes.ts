import { flipOutcome } from './outcomes/flipOutcome';
import { gainOutcome, leftGainOutcome } from './outcomes/gainOutcome';
import { noiseOutcome, silenceOutcome } from './outcomes/noiseOutcome';
import { comparedOutcome, leftPolarityOutcome, recordKicksOutcome } from './outcomes/polarityOutcome';
import { startOutcome } from './outcomes/startOutcome';
import type { OutcomeRule, TakeAndNext } from './outcomes/outcomeRule';
import { actionIds, type ActionId, type Outcome } from './reportTypes';

const rules: Readonly<Record<ActionId, OutcomeRule>> = {
  'export-together': startOutcome,
  'kick-gain': gainOutcome,
  'overhead-gain': gainOutcome,
  'flip-overhead': flipOutcome,
  'look-for-noise': noiseOutcome,
  'leave-silence': silenceOutcome,
  'record-kicks': recordKicksOutcome,
  'compare-polarities': comparedOutcome,
  'kick-gain-leave': leftGainOutcome,
  'overhead-gain-leave': leftGainOutcome,
  'polarity-leave': leftPolarityOutcome,
};

/**
 * What became of the actions of one take in the take that follows it: "The flip worked: 1.3 dB of low end came back; we
 * expected 1.4."
 *
 * @param takes - `before` and `after` judged for the same reader; `doneActions` holds ids of `nextActions(before)`. Ids
 *   that nothing is known of are left out: a later version may have made them.
 * @returns in order of what matters, what was to be left alone last; each at most 25 words
 * @example
 * const spectra = { before: spectrum, after: spectrum };
 * outcomes({ before: figures, after: figures, doneActions: [], reader, spectra }) // []
 */
export function outcomes(takes: TakeAndNext): Outcome[] {
  const done = new Set(takes.doneActions);
  const told = actionIds
    .filter((id) => done.has(id))
    .map((actionId) => ({ actionId, ...rules[actionId](takes, actionId) }));
  return told.sort((a, b) => Number(hadClipped(b, takes)) - Number(hadClipped(a, takes)));
}

/** A preamp that was turned because of clipping comes first, as it did among the actions. */
function hadClipped({ actionId }: Outcome, { before }: TakeAndNext): boolean {
  return (
    (actionId === 'kick-gain' && before.kick.level === 'clipped') ||
    (actionId === 'overhead-gain' && before.overhead.level === 'clipped')
  );
}
