import type { VerdictReason } from '../facts';
import type { AgreementReport, Finding, FindingStatus, ReportFigures } from '../report/reportTypes';
import { counted, decimalText, bandText } from './words';

type Said = Pick<Finding, 'sentence' | 'why' | 'next'>;

/** Below this the two low ends have nothing to do with each other; above, the overhead's is merely weak. Our choice. */
const IN_COMMON = 0.1;
const LOW_END_TO_HZ = 200;
const FEW_HITS = 3;

/** What a flip would do to the low end, and whether to do it. */
export function addingUpFinding({ agreement }: ReportFigures): Finding {
  return { topic: 'adding-up', status: addingUpStatus(agreement), ...said(agreement) };
}

/** docs/measurements.md, 5: a sure flip is a *fix*, a sure keep is *good*, what is unsure is a *watch*. */
export function addingUpStatus(agreement: AgreementReport): FindingStatus {
  if (agreement.verdict === 'cannot-tell') return 'cannot-tell';
  if (agreement.verdict === 'either-way') return isMixed(agreement) || !agreement.sure ? 'watch' : 'good';
  if (!agreement.sure) return 'watch';
  return agreement.verdict === 'flip' ? 'fix' : 'good';
}

/** docs/measurements.md, 5: with fewer than three hits nothing is sure. */
export function hasFewHits({ hitsUsed }: AgreementReport): boolean {
  return hitsUsed < FEW_HITS;
}

function said(agreement: AgreementReport): Said {
  switch (agreement.verdict) {
    case 'flip':
      return agreement.sure ? flip(agreement) : unsure(agreement);
    case 'keep':
      return agreement.sure ? keep(agreement) : unsure(agreement);
    case 'either-way':
      return isMixed(agreement) ? mixed(agreement) : eitherWay(agreement);
    case 'cannot-tell':
      return cannotTell(agreement);
  }
}

function flip(agreement: AgreementReport): Said {
  const gain = gainText(agreement);
  const hits = `${agreement.agreeingHits} of ${agreement.hitsUsed} hits`;
  return {
    sentence: cutMatters(agreement)
      ? `Flip, without a low cut on the overhead: low end cancels in ${hits}, flipping returns ${gain} dB; no retake needed.`
      : `Flip the overhead: low end cancels in ${hits}, flipping returns ${gain} dB; do it on this take, no retake needed.`,
    why: `Below 150 Hz the two microphones pull against each other, so the kick sounds thin.${also(agreement)}`,
    next: 'Flip the overhead on this sheet, without loss. For the next take press its polarity switch, with the monitors muted.',
  };
}

function keep(agreement: AgreementReport): Said {
  const gain = gainText(agreement);
  return {
    sentence: cutMatters(agreement)
      ? `Keep the polarity, without a low cut on the overhead: below 150 Hz the microphones add and flipping would cost ${gain} dB.`
      : `Keep the polarity: the microphones add below 150 Hz and flipping would cost ${gain} dB; leave switches and stands alone.`,
    why: `The two low ends push together at the kick.${also(agreement)}`,
    next: 'Leave switches and stands alone.',
  };
}

function unsure(agreement: AgreementReport): Said {
  const flips = agreement.verdict === 'flip';
  const what = flips ? 'Flipping would return' : 'Flipping would cost';
  return {
    sentence: `${what} ${gainText(agreement)} dB of low end, but ${doubt(agreement)}; compare both by ear, then record eight hard kicks.`,
    why: `The low end leans one way, though not enough to be sure.${cutMatters(agreement) ? ' It holds only without a low cut on the overhead.' : ''}${also(agreement)}`,
    next: 'Listen to both on this sheet. Nothing is lost by either.',
  };
}

function doubt(agreement: AgreementReport): string {
  if (hasFewHits(agreement))
    return `only ${counted(agreement.hitsUsed, 'kick hit')} ${agreement.hitsUsed === 1 ? 'says' : 'say'} so`;
  const oneSign = new Set(agreement.bands.map((band) => Math.sign(band.flipGainDb))).size <= 1;
  return oneSign ? 'that is little' : 'the lowest octaves don’t all say so';
}

function eitherWay(agreement: AgreementReport): Said {
  const unrelated = Math.abs(agreement.lowCorrelation ?? 0) < IN_COMMON;
  const because = unrelated ? 'the low ends have little in common' : 'the overhead carries little low end';
  return {
    sentence: `Polarity changes under half a decibel because ${because}; choose by ear and spend time on placement.`,
    why: `Either way the kick keeps its low end.${also(agreement)}`,
    next: 'Choose by ear. Moving the overhead changes more than its polarity.',
  };
}

function isMixed(agreement: AgreementReport): boolean {
  return contraryLow(agreement).length > 0;
}

function contraryLow(agreement: AgreementReport): AgreementReport['contraryBands'] {
  return agreement.contraryBands.filter((band) => band.centreHz < LOW_END_TO_HZ);
}

function mixed(agreement: AgreementReport): Said {
  const band = strongest(contraryLow(agreement));
  const does = (band?.flipGainDb ?? 0) > 0 ? 'gains' : 'loses';
  const size = decimalText(Math.abs(band?.flipGainDb ?? 0));
  return {
    sentence: `Mixed: flipping changes the low end little but ${does} ${size} dB at ${bandText(band?.centreHz ?? 0)}; compare by ear, then move the overhead slightly.`,
    why: 'Some low bands add and others cancel, whichever the polarity.',
    next: 'Compare both by ear, move the overhead a hand’s width and measure again.',
  };
}

const whyNot: Record<Exclude<VerdictReason, 'hits-disagree'>, string> = {
  'no-kick-hits': 'no kick hit was found, so nothing can be added up',
  'hits-unlike': 'the two files fit together differently at every kick, as two takes would',
  'arrival-spread': 'the kick reaches the overhead differently from hit to hit',
  'bands-disagree': 'the lowest octaves contradict each other, so either polarity could win',
  'overhead-silent': 'the overhead is silent at the kicks',
  'late-start': 'the files don’t start together, and a few milliseconds turn a polarity over',
};

function cannotTell({ reason, agreeingHits, hitsUsed }: AgreementReport): Said {
  const because =
    reason === null || reason === 'hits-disagree'
      ? `only ${agreeingHits} of ${hitsUsed} kick hits agree, so either polarity could win`
      : whyNot[reason];
  if (reason === 'late-start') {
    return {
      sentence: `Can’t tell: ${because}; export both from the same start.`,
      why: 'A polarity is told only of two files that line up to a part of a millisecond.',
      next: 'Line the files up, export both from the same start and add them again.',
    };
  }
  if (reason === 'hits-unlike') {
    return {
      sentence: `Can’t tell: ${because}; record eight hard kicks with nothing else.`,
      why: 'Two microphones that heard one pass stand alike at every kick.',
      next: 'See that both files are of one take. If they are, record eight hard kicks with nothing else.',
    };
  }
  return {
    sentence: `Can’t tell: ${because}; record eight hard kicks with nothing else.`,
    why: 'A polarity is told only where at least three in four kick hits agree.',
    next: 'Record eight hard kicks with nothing else.',
  };
}

function cutMatters({ lowCut, verdict }: AgreementReport): boolean {
  return lowCut !== null && lowCut.verdict !== verdict;
}

function also(agreement: AgreementReport): string {
  const band = strongest(agreement.contraryBands);
  if (!band) return '';
  return ` At ${bandText(band.centreHz)} a flip ${band.flipGainDb > 0 ? 'gains' : 'loses'} ${decimalText(Math.abs(band.flipGainDb))} dB.`;
}

function strongest(
  bands: AgreementReport['contraryBands'],
): AgreementReport['contraryBands'][number] | undefined {
  return [...bands].sort((a, b) => Math.abs(b.flipGainDb) - Math.abs(a.flipGainDb)).at(0);
}

function gainText({ flipGainMatchedDb }: AgreementReport): string {
  return decimalText(Math.abs(flipGainMatchedDb ?? 0));
}
