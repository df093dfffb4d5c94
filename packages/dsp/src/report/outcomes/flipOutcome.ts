import { decimalText } from '../../findings/words';
import type { AgreementReport } from '../reportTypes';
import { said, type OutcomeRule, type OutcomeSaid } from './outcomeRule';
import { seenFlip } from './seenFlip';

/** Low end worth mentioning between two takes (docs/measurements.md, 8). */
const LOW_END_STEP_DB = 0.5;

/**
 * Whether the flip is in the next take, and how much low end came back: the low end as recorded, levels matched, which
 * neither the strength of the hits nor the preamps move.
 */
export const flipOutcome: OutcomeRule = (takes) => {
  const { before, after } = takes;
  const cameBackDb = lowEndGain(before.agreement, after.agreement);
  if (after.agreement.verdict === 'cannot-tell' || cameBackDb === null) return cannotTell(after.agreement);
  const seen = seenFlip(takes);
  const cameBack = `${decimalText(cameBackDb)} dB of low end came back`;
  const helped = cameBackDb >= LOW_END_STEP_DB;
  if (seen === 'as-before') {
    return notThere(
      helped
        ? `${cameBack} all the same, so something else moved.`
        : 'the polarity is as before; flip it on this sheet, or press the switch.',
    );
  }
  if (helped) return worked(after.agreement, `${cameBack}${expected(before.agreement)}.`);
  if (seen === 'flipped') {
    return said(
      'watch',
      'The overhead is flipped:',
      `the low end hardly gained (${decimalText(cameBackDb)} dB)${expected(before.agreement)}.`,
    );
  }
  return after.agreement.verdict === 'flip'
    ? notThere('the low end still cancels; flip it on this sheet, or press the switch.')
    : said('cannot-tell', CANNOT_TELL, 'the low end hardly changed; was the overhead moved too?');
};

const CANNOT_TELL = 'Can’t tell whether the flip worked:';

function worked(after: AgreementReport, rest: string): OutcomeSaid {
  const sure = after.sure && after.verdict !== 'flip';
  return sure
    ? said('good', 'The flip worked:', rest)
    : said('watch', 'The flip helped, not for sure:', rest);
}

function notThere(rest: string): OutcomeSaid {
  return said('watch', 'The flip isn’t in this take:', rest);
}

function cannotTell({ hitsUsed, agreeingHits, reason }: AgreementReport): OutcomeSaid {
  const because =
    hitsUsed === 0
      ? 'this take holds no kick hit'
      : reason === 'hits-disagree'
        ? `only ${agreeingHits} of ${hitsUsed} kick hits agree`
        : 'the low end of this take says nothing sure';
  return said('cannot-tell', CANNOT_TELL, `${because}; record eight hard kicks.`);
}

function expected({ flipGainMatchedDb }: AgreementReport): string {
  return flipGainMatchedDb === null ? '' : `; we expected ${decimalText(flipGainMatchedDb)}`;
}

/** @returns dB; null where one of the takes has nothing to add up */
function lowEndGain(before: AgreementReport, after: AgreementReport): number | null {
  const [from, to] = [recordedLowEnd(before), recordedLowEnd(after)];
  return from === null || to === null ? null : to - from;
}

function recordedLowEnd({ choices }: AgreementReport): number | null {
  return choices.find((choice) => choice.name === 'as-recorded')?.lowEndDb ?? null;
}
