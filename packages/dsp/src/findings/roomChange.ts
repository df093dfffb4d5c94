import type { ComparedFigure, ComparedKey } from '../measurements/comparing/comparedFigure';
import type { FindingStatus } from '../report/reportTypes';
import { capitalised, decimalText, wholeDbfsText, wholeDbText } from './words';

/** What a change to a room did, as a sentence and the figures that tell it. */
export interface RoomChangeTold {
  readonly status: FindingStatus;
  readonly strong: string;
  readonly rest: string;
  /** Those that surely changed first, the largest first; then some that didn't. */
  readonly figures: readonly ComparedFigure[];
}

/**
 * What a room can change; what only says how somebody played is left out.
 *
 * @example
 * roomChangeKeys.includes('evenness') // false
 */
export const roomChangeKeys: readonly ComparedKey[] = [
  'decay-500',
  'decay-1000',
  'decay-2000',
  'decay-4000',
  'early-to-late',
  'overhead-63',
  'overhead-125',
  'brightness',
  'noise-overhead',
  'noise-kick',
];

/** As many rows as still read as one finding; our choice. */
const MOST_FIGURES = 4;

type Telling = (figure: ComparedFigure) => string;

const decay =
  (band: string): Telling =>
  ({ before, after, word }) =>
    `a snare dies ${decimalText(Math.abs((after ?? 0) - (before ?? 0)), 2)} s ${word === 'longer' ? 'later' : 'sooner'} at ${band}`;

const lowEnd =
  (band: string): Telling =>
  ({ change, word }) =>
    `the overhead hears ${wholeDbText(change ?? 0)} dB ${word === 'fuller' ? 'more' : 'less'} at ${band}`;

const noise =
  (microphone: string): Telling =>
  ({ change, after, word }) =>
    `the ${microphone}’s noise floor ${word === 'noisier' ? 'rose' : 'fell'} ${wholeDbText(change ?? 0)} dB, to ${wholeDbfsText(after ?? 0)} dBFS`;

const tellings: Partial<Record<ComparedKey, Telling>> = {
  'decay-500': decay('500 Hz'),
  'decay-1000': decay('1 kHz'),
  'decay-2000': decay('2 kHz'),
  'decay-4000': decay('4 kHz'),
  'early-to-late': ({ word }) =>
    word === 'higher' ? 'less of a snare hangs on after 50 ms' : 'more of a snare hangs on after 50 ms',
  'overhead-63': lowEnd('63 Hz'),
  'overhead-125': lowEnd('125 Hz'),
  brightness: ({ change, word }) => `a snare is ${wholeDbText(change ?? 0)} dB ${word} in the overhead`,
  'noise-overhead': noise('overhead'),
  'noise-kick': noise('kick'),
};

const kindOf = (key: ComparedKey): string => key.split('-')[0];

/**
 * What the takes before and after a change to a room say it did.
 *
 * @param figures - as `compareTakes` gives them
 * @example
 * const compared = compareTakes({ before: facts, after: facts, gainKnownSame: true });
 * roomChange(compared).status // 'cannot-tell'
 */
export function roomChange(figures: readonly ComparedFigure[]): RoomChangeTold {
  const ofRoom = roomChangeKeys.flatMap((key) => figures.filter((figure) => figure.key === key));
  const told = ofRoom.filter(({ reason }) => reason === null);
  const clear = told.filter((figure) => figure.clear).sort((one, other) => steps(other) - steps(one));
  if (told.length === 0) return cannotTell(ofRoom);
  const rows = [...clear, ...told.filter((figure) => !figure.clear)].slice(
    0,
    Math.max(MOST_FIGURES, clear.length),
  );
  if (clear.length === 0) return { ...nothingClear(told), figures: rows };
  const worse = clear.some(({ key, word }) => key.startsWith('noise') && word === 'noisier');
  return { status: worse ? 'watch' : 'good', ...sentence(clear), figures: rows };
}

/** The largest of each kind, two at most: the rows below hold the others. */
function sentence(clear: readonly ComparedFigure[]): { strong: string; rest: string } {
  const byEar = [...clear].sort((one, other) => earOrder(one) - earOrder(other));
  const kinds = byEar.filter(
    (figure, i) => byEar.findIndex(({ key }) => kindOf(key) === kindOf(figure.key)) === i,
  );
  const said = kinds.slice(0, 2).map((figure) => tellings[figure.key]?.(figure) ?? '');
  const rest = clear.some(({ key, word }) => key.startsWith('noise') && word === 'noisier')
    ? 'Switch it off while you record.'
    : surely(clear);
  return { strong: `${capitalised(said.join(', and '))}.`, rest };
}

/** How long a snare rings says more than where its energy lies, and most in the band where it changed by most seconds. */
function earOrder({ key, before, after }: ComparedFigure): number {
  return key.startsWith('decay') ? -Math.abs((after ?? 0) - (before ?? 0)) : 0;
}

/** How many hits stand behind it. */
function surely(clear: readonly ComparedFigure[]): string {
  const counted = clear.find(({ hitsBefore }) => hitsBefore !== null);
  return counted ? `Sure: ${counted.hitsBefore} hits before, ${counted.hitsAfter} after.` : '';
}

function nothingClear(told: readonly ComparedFigure[]): {
  status: FindingStatus;
  strong: string;
  rest: string;
} {
  const names = new Map([
    ['decay', 'decay'],
    ['early', 'decay'],
    ['overhead', 'low end'],
    ['noise', 'noise'],
  ]);
  const kinds = [...new Set(told.flatMap(({ key }) => names.get(kindOf(key)) ?? []))];
  const list = kinds.length > 1 ? `${kinds.slice(0, -1).join(', ')} or ${kinds.at(-1)}` : kinds.join('');
  return { status: 'cannot-tell', strong: 'No clear change', rest: `in ${list || 'what was compared'}.` };
}

function cannotTell(figures: readonly ComparedFigure[]): RoomChangeTold {
  const few = figures.some(({ reason }) => reason === 'too-few-hits');
  const rest = few
    ? 'too few hard snare hits stand alone; play six, two seconds apart, before and after.'
    : 'one of the takes holds nothing to compare; record hard snare hits and three silent seconds.';
  return { status: 'cannot-tell', strong: 'Can’t tell:', rest, figures: [] };
}

/** How many times its step a figure changed by. */
const steps = ({ change, step }: ComparedFigure): number => Math.abs(change ?? 0) / step.size;
