import type { BalanceReport, Finding, ReportFigures } from '../report/reportTypes';
import { counted, wholeDbText } from './words';

/** docs/measurements.md, 6: *watch* above this; common practice, no source. */
const WATCH_DB = 3;
/** Nearer than this nobody hears which is louder; our choice. */
const ALIKE_DB = 1;
/** Cymbals further below the drums than this aren’t beside them any more, which is no fault; our choice. */
const FAR_DB = 6;

/** How cymbals and drums stand to each other in the overhead; nothing where that wasn't measured. */
export function balanceFindings({ balance }: ReportFigures): Finding[] {
  if (!balance) return [];
  return [balance.differenceDb === null ? cannotTell(balance) : told(balance.differenceDb)];
}

function told(differenceDb: number): Finding {
  const size = wholeDbText(differenceDb);
  if (differenceDb > WATCH_DB) {
    return {
      topic: 'balance',
      status: 'watch',
      sentence: `Cymbals are ${size} dB louder than drums overhead, which no fader fixes later; play them lighter or raise the microphone a little.`,
      why: 'One overhead holds both on a single track, so turning one of them down turns the other down too.',
      next: 'Play cymbals lighter, or raise the overhead and aim it at the snare.',
    };
  }
  const how =
    Math.abs(differenceDb) < ALIKE_DB
      ? 'about as loud as'
      : `${size} dB ${differenceDb > 0 ? 'louder' : 'quieter'} than`;
  return {
    topic: 'balance',
    status: 'good',
    sentence: `Cymbals are ${how} drums in the overhead, so ${differenceDb < -FAR_DB ? 'they drown nothing' : 'the two sit together'}; leave the microphone where it is.`,
    why: 'One overhead holds both on a single track, and they fit.',
    next: 'Leave the microphone where it is.',
  };
}

function cannotTell({ drumHits, cymbalHits }: BalanceReport): Finding {
  return {
    topic: 'balance',
    status: 'cannot-tell',
    sentence: `Can’t tell cymbals against drums: ${counted(drumHits, 'drum hit')} and ${counted(cymbalHits, 'cymbal hit')} stand alone; play five of each with nothing else.`,
    why: 'What is struck together, or right after something else, can’t be told apart.',
    next: 'Play five drum hits and five cymbal hits, one at a time.',
  };
}
