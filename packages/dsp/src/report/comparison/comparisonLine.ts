import { capitalised, decimalText } from '../../findings/words';
import type { ComparedFigure } from '../../measurements/comparing/comparedFigure';
import type { LineSentence, Outcome } from '../reportTypes';
import { comparedNames } from './comparedNames';
import type { ComparedPolarity } from './comparedPolarity';

export interface ComparisonLineOptions {
  readonly isSameTake: boolean;
  /** What became of what was done between the takes; empty where nothing was noted. */
  readonly outcomes: readonly Outcome[];
  readonly polarity: ComparedPolarity;
  readonly figures: readonly ComparedFigure[];
}

const SENTENCES = 2;
/** Low end worth mentioning between two takes (docs/measurements.md, 8). */
const LOW_END_STEP_DB = 0.5;

/**
 * The one or two sentences a comparison opens with: what became of what was done, or what changed most, or that nothing did.
 * @example
 * const sound = { likeness: 1, seen: 'as-before', hits: 8, turnedHits: 0 };
 * const polarity = comparedPolarity({ before: figures, after: figures, sound, notedFlip: false });
 * comparisonLine({ isSameTake: true, outcomes: [], polarity, figures: [] })[0].action // 'The same take twice:'
 */
export function comparisonLine(options: ComparisonLineOptions): LineSentence[] {
  if (options.isSameTake) {
    return [{ action: 'The same take twice:', reason: 'no clear change, as it should be.' }];
  }
  const news = [...becameOf(options.outcomes), ...flipAlone(options)];
  const told = [...news, ...changes(options, news.length > 0)].slice(0, SENTENCES);
  return told.length > 0 ? told : [nothing(options.figures)];
}

/** That something left alone still fits is no news. */
function becameOf(outcomes: readonly Outcome[]): LineSentence[] {
  return outcomes
    .filter(({ actionId }) => !actionId.endsWith('-leave'))
    .map((outcome, place) => (place > 0 && isGoodGain(outcome) ? leaveIt(outcome) : plain(outcome)));
}

const plain = ({ strong, rest }: Outcome): LineSentence => ({ action: strong, reason: rest });

const isGoodGain = ({ actionId, status }: Outcome): boolean =>
  status === 'good' && (actionId === 'kick-gain' || actionId === 'overhead-gain');

const leaveIt = ({ actionId }: Outcome): LineSentence => ({
  action: `Leave the ${actionId === 'kick-gain' ? 'kick' : 'overhead'} preamp`,
  reason: 'there.',
});

/** A flip that no outcome speaks of. */
function flipAlone({ outcomes, polarity }: ComparisonLineOptions): LineSentence[] {
  const { seen, beforeDb, afterDb } = polarity;
  const told = outcomes.some(({ actionId }) => actionId === 'flip-overhead');
  if (told || seen !== 'flipped') return [];
  const action = 'The overhead was flipped:';
  if (beforeDb === null || afterDb === null) return [{ action, reason: 'the low end turned over.' }];
  const changeDb = afterDb - beforeDb;
  const size = decimalText(Math.abs(changeDb));
  if (Math.abs(changeDb) < LOW_END_STEP_DB) {
    return [{ action, reason: `the low end hardly changed (${size} dB).` }];
  }
  const way = changeDb > 0 ? 'came back' : 'was lost';
  return [{ action, reason: `${size} dB of low end ${way}.` }];
}

/** Clear changes, the largest by what is worth mentioning first. The low end is told already where there is news of a flip. */
function changes({ figures, polarity }: ComparisonLineOptions, hasNews: boolean): LineSentence[] {
  const toldAlready = hasNews && (polarity.noted || polarity.seen === 'flipped');
  return figures
    .filter(({ key, clear }) => clear && !(toldAlready && key === 'low-end'))
    .sort((a, b) => inSteps(b) - inSteps(a))
    .flatMap((figure) => changeSaid(figure, hasNews));
}

function inSteps({ change, step }: ComparedFigure): number {
  return change === null ? 0 : Math.abs(change) / step.size;
}

/** After news of what was done, peaks that moved with a preamp say nothing more. */
function changeSaid({ key, unit, word, before, after }: ComparedFigure, hasNews: boolean): LineSentence[] {
  if (word === null || before === null || after === null) return [];
  if (hasNews && key.startsWith('hardest-')) return [];
  const { label, decimals } = comparedNames[key];
  const size = decimalText(Math.abs(after - before), decimals);
  const changeUnit = unit === 'dBFS' ? 'dB' : unit;
  return [{ action: `${capitalised(label)}: ${word},`, reason: `by ${size} ${changeUnit}.` }];
}

function nothing(figures: readonly ComparedFigure[]): LineSentence {
  return figures.some(({ change }) => change !== null)
    ? { action: 'No clear change:', reason: 'nothing moved by more than it varies from hit to hit.' }
    : {
        action: 'Can’t tell what changed:',
        reason: 'the takes hold too few hits; record six of each kind in both.',
      };
}
