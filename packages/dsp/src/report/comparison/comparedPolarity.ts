import { decimalText } from '../../findings/words';
import type { PolarityBetween } from '../../measurements/comparing/polarityBetween';
import type { AgreementReport, ReportFigures } from '../reportTypes';

export interface ComparedPolarityOptions {
  readonly before: ReportFigures;
  readonly after: ReportFigures;
  /** What the pair spectra alone say. */
  readonly sound: PolarityBetween;
  /** Whether it was written down that the polarity was switched between the takes. */
  readonly notedFlip: boolean;
}

/** Polarity from one take to another: what was noted, what the sound says, and what it did to the low end. */
export interface ComparedPolarity {
  readonly noted: boolean;
  readonly seen: 'flipped' | 'as-before' | 'cannot-tell';
  /** Whether the sound says what was noted; null where it can't tell. */
  readonly confirmed: boolean | null;
  /** Empty where nothing was noted and nothing turned over. */
  readonly sentence: string;
  /** Low end of the two added as recorded, levels matched, against no help and no harm; dB. */
  readonly beforeDb: number | null;
  readonly afterDb: number | null;
  /** Where a flip of the take before should have led; null where no flip is seen. */
  readonly expectedDb: number | null;
}

/**
 * Whether the polarity was switched between two takes: confirmed or contradicted in words.
 *
 * @returns levels are null where a take has nothing to add up
 * @example
 * const spectra = { before: spectrum, after: spectrum };
 * const sound = polarityBetween({ before: facts, after: facts, spectra });
 * comparedPolarity({ before: figures, after: figures, sound, notedFlip: false }).seen // 'as-before'
 */
export function comparedPolarity(options: ComparedPolarityOptions): ComparedPolarity {
  const { before, after, sound, notedFlip } = options;
  const seen = sound.seen ?? 'cannot-tell';
  return {
    noted: notedFlip,
    seen,
    confirmed: sound.seen && (seen === 'flipped') === notedFlip,
    sentence: said(options),
    beforeDb: lowEndOf(before.agreement, 'as-recorded'),
    afterDb: lowEndOf(after.agreement, 'as-recorded'),
    expectedDb: seen === 'flipped' ? lowEndOf(before.agreement, 'flipped') : null,
  };
}

function said({ before, after, sound, notedFlip }: ComparedPolarityOptions): string {
  switch (sound.seen) {
    case 'flipped':
      return notedFlip
        ? `You noted a flip, and the sound confirms it: the low end turned over${inHits(sound)}.${reached(before.agreement, after.agreement)}`
        : `The sound says the overhead was flipped between these takes, though nothing says so: its low end turned over against the kick’s${inHits(sound)}.`;
    case 'as-before':
      return notedFlip
        ? 'You noted a flip, but the sound says nothing turned over: the two microphones stand to each other as before.'
        : '';
    case null:
      return notedFlip
        ? `You noted a flip; the sound can’t confirm it: ${whyNot(before.agreement, after.agreement)}.`
        : '';
  }
}

/** Where few hits show alone what all say together, their number would only confuse. */
function inHits({ hits, turnedHits }: PolarityBetween): string {
  return turnedHits * 2 > hits ? ` in ${turnedHits} of ${hits} hits` : '';
}

function reached(before: AgreementReport, after: AgreementReport): string {
  const to = lowEndOf(after, 'as-recorded');
  const expected = lowEndOf(before, 'flipped');
  if (to === null || expected === null) return '';
  return ` It was to reach ${decimalText(expected)} dB and reached ${decimalText(to)}.`;
}

function whyNot(before: AgreementReport, after: AgreementReport): string {
  return Math.min(before.hitsUsed, after.hitsUsed) === 0
    ? 'one of the takes holds no kick hit'
    : 'too much else moved; record eight hard kicks before and after the switch';
}

function lowEndOf({ choices }: AgreementReport, name: 'as-recorded' | 'flipped'): number | null {
  return choices.find((choice) => choice.name === name)?.lowEndDb ?? null;
}
