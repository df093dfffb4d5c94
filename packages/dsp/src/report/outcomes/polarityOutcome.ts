import { addingUpStatus } from '../../findings/addingUpFinding';
import { capitalised, countText, decimalText } from '../../findings/words';
import type { AgreementReport } from '../reportTypes';
import { said, type OutcomeRule, type OutcomeSaid } from './outcomeRule';
import { seenFlip } from './seenFlip';

/** Whether the two microphones still add where the switches were to be left alone. */
export const leftPolarityOutcome: OutcomeRule = (takes) => {
  const { agreement } = takes.after;
  const size = decimalText(Math.abs(agreement.flipGainMatchedDb ?? 0));
  switch (agreement.verdict) {
    case 'keep':
      return said('good', 'The polarity still adds:', `flipping would cost ${size} dB of low end.`);
    case 'either-way':
      return said(
        'good',
        'The polarity hardly matters now:',
        `a flip would change the low end by ${size} dB.`,
      );
    case 'flip':
      return said(
        'watch',
        seenFlip(takes) === 'flipped' ? 'The polarity was switched:' : 'The microphones cancel now:',
        `flipping would return ${size} dB${seenFlip(takes) === 'flipped' ? '' : '; something moved'}.`,
      );
    case 'cannot-tell':
      return cannotTell(agreement);
  }
};

/** What can be told after both polarities were compared by ear: which was chosen, never which sounded better. */
export const comparedOutcome: OutcomeRule = (takes) => {
  const { agreement } = takes.after;
  const size = decimalText(Math.abs(agreement.flipGainMatchedDb ?? 0));
  if (agreement.verdict === 'cannot-tell') return cannotTell(agreement);
  const status = addingUpStatus(agreement);
  if (status === 'fix') {
    return said('watch', 'The sheet can tell now:', `flipping would return ${size} dB of low end.`);
  }
  if (status === 'good' && agreement.verdict === 'keep') {
    return said('good', 'The sheet can tell now:', `flipping would cost ${size} dB, so keep it.`);
  }
  const chosen = { flipped: 'You flipped the overhead:', 'as-before': 'You kept the polarity:' };
  const seen = seenFlip(takes);
  return said(
    'cannot-tell',
    seen ? chosen[seen] : 'Your ear decides:',
    `the low end differs by ${size} dB, too little to say which is better.`,
  );
};

/** Whether the hard kicks are there, and whether they settled the polarity. */
export const recordKicksOutcome: OutcomeRule = ({ after }) => {
  const { agreement } = after;
  const kicks = agreement.hitsUsed;
  if (kicks === 0)
    return said('cannot-tell', 'No kick was found:', 'record eight hard ones with nothing else.');
  const there = kickCount(kicks);
  const settled = agreement.verdict !== 'cannot-tell' && agreement.sure;
  if (settled) return said('good', there, `they settle the polarity: ${settles[agreement.verdict]}.`);
  if (kicks < ENOUGH_KICKS)
    return said('watch', there, 'eight would settle more; play them with nothing else.');
  return agreement.verdict === 'cannot-tell'
    ? said('watch', there, `only ${agreement.agreeingHits} of them agree; move the overhead slightly.`)
    : said('watch', there, 'the low end leans too little to be sure; compare by ear.');
};

/** What was asked for. */
const ENOUGH_KICKS = 8;

const settles = {
  keep: 'keep it',
  flip: 'flip the overhead',
  'either-way': 'either way is fine',
  'cannot-tell': 'nothing yet',
} as const;

function kickCount(kicks: number): string {
  return kicks === 1 ? 'One kick is there:' : `${capitalised(countText(kicks))} kicks are there:`;
}

function cannotTell({ hitsUsed }: AgreementReport): OutcomeSaid {
  return said(
    'cannot-tell',
    'Can’t tell the polarity in this take:',
    hitsUsed === 0 ? 'no kick hit was found.' : 'its kick hits disagree; record eight hard ones.',
  );
}
