import type { ArrivalReason } from '../facts';
import type { Finding, Reader, ReportFigures } from '../report/reportTypes';
import { counted, decimalText, lengthText } from './words';

/** Beyond this an overhead would be some 4 m further away than the kick microphone; our choice. */
const FAR_MS = 12;
/** Earlier than this is no matter of placement: the overhead is never nearer to the drum by so much; our choice. */
const EARLY_MS = -0.5;
const CONFIDENT = 0.5;
/** From this many hits on it isn't their number that leaves a doubt. */
const ENOUGH_HITS = 6;

/** How much later the overhead hears the kick, and how far that is. */
export function arrivalFinding(figures: ReportFigures, reader: Pick<Reader, 'lengthUnit'>): Finding {
  const { arrivalMs, pathDifferenceM, hitsUsed, confidence, reason } = figures.arrival;
  if (arrivalMs === null) return cannotTell(reason ?? 'hits-disagree');
  const ms = decimalText(Math.abs(arrivalMs));
  if (arrivalMs > FAR_MS || arrivalMs < EARLY_MS) return offset(ms, arrivalMs > 0 ? 'later' : 'earlier');
  const when = arrivalMs >= 0 ? 'later' : 'earlier';
  const where = `about ${lengthText(pathDifferenceM ?? 0, reader.lengthUnit)} ${arrivalMs >= 0 ? 'further away' : 'nearer'}`;
  if (confidence < CONFIDENT) {
    const hasFew = hitsUsed < ENOUGH_HITS;
    const doubt = hasFew ? 'few hits show it' : 'something may hide it';
    return {
      topic: 'arrival',
      status: 'watch',
      sentence: `The overhead seems to hear the kick ${ms} ms ${when}, ${where}, but ${doubt}; record eight kicks.`,
      why: hasFew
        ? `It was seen clearly in ${counted(hitsUsed, 'hit')}.`
        : 'What is struck together with a kick may reach the overhead before it.',
      next: 'Record eight hard kicks with nothing else.',
    };
  }
  return {
    topic: 'arrival',
    status: 'good',
    sentence: `The overhead hears the kick ${ms} ms ${when}, ${where}, alike from hit to hit; nothing to change.`,
    why: 'A distance between microphones is no fault by itself: what counts is how they add.',
    next: 'Nothing to change. Note it, to see what moving a stand does.',
  };
}

function offset(ms: string, when: 'later' | 'earlier'): Finding {
  return {
    topic: 'arrival',
    status: 'watch',
    sentence: `The overhead hears the kick ${ms} ms ${when}, which no placement explains; check that both files start together.`,
    why: 'Files cut or exported apart no longer line up, and then nothing about how they add is true.',
    next: 'Export both files from the same start.',
  };
}

const whyNot: Record<ArrivalReason, string> = {
  'no-kick-hits': 'no kick hit was found',
  'too-few-hits': 'other sounds hide the kick in the overhead',
  'hits-disagree': 'it differs from hit to hit',
  'overhead-silent': 'the overhead is silent at the kicks',
  'methods-disagree': 'two ways of measuring it disagree',
  'late-start': 'the files don’t start together',
};

function cannotTell(reason: ArrivalReason): Finding {
  if (reason === 'late-start') {
    return {
      topic: 'arrival',
      status: 'cannot-tell',
      sentence: `Can’t tell how much later the overhead hears the kick: ${whyNot[reason]}; export both from the same start.`,
      why: 'Where the start ends and the way of the sound begins can’t be heard.',
      next: 'Line the files up, export both from the same start and add them again.',
    };
  }
  return {
    topic: 'arrival',
    status: 'cannot-tell',
    sentence: `Can’t tell how much later the overhead hears the kick: ${whyNot[reason]}; record eight hard kicks with nothing else.`,
    why: 'The arrival is told only where hits agree on it.',
    next: 'Record eight hard kicks with nothing else.',
  };
}
