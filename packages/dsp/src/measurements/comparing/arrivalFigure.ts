import type { ArrivalFacts } from '../../facts';
import { untold, wordOf, type ComparedFigure, type FigureRule } from './comparedFigure';
import { FEWEST_HITS, worthSteps } from './takeChange';
import type { TakeSide } from './takeSide';

const rule: FigureRule = {
  key: 'arrival',
  unit: 'ms',
  step: worthSteps.arrivalMs,
  words: { more: 'later', less: 'earlier' },
};
/** Standard error of a median of n values whose quartiles lie an IQR apart, normal values: (1.2533 / 1.349)·IQR/√n. */
const ERROR_OF_IQR = 0.929;
const NORMAL_95 = 1.96;

/** The arrival is told once over all hits with its spread, so its interval follows from the spread. */
export function arrivalFigure(sides: {
  readonly before: TakeSide;
  readonly after: TakeSide;
}): ComparedFigure {
  const [before, after] = [sides.before.pair.arrival, sides.after.pair.arrival];
  const values = { before: before.arrivalMs, after: after.arrivalMs };
  const counts = { hitsBefore: before.hitsUsed, hitsAfter: after.hitsUsed };
  if (values.before === null || values.after === null) {
    return { ...untold(rule, 'cannot-tell'), ...counts };
  }
  const errors = [errorMs(before), errorMs(after)];
  if (errors.includes(null)) return { ...untold(rule, 'too-few-hits'), ...counts };
  const change = values.after - values.before;
  const half = NORMAL_95 * Math.hypot(...errors.map((error) => error ?? 0));
  const interval95 = { low: change - half, high: change + half };
  const clear = Math.abs(change) > Math.max(half, rule.step.size);
  const word = wordOf(rule, { change, clear });
  return {
    ...untold(rule, 'cannot-tell'),
    ...values,
    ...counts,
    change,
    interval95,
    clear,
    reason: null,
    word,
  };
}

function errorMs({ arrivalIqrMs, hitsUsed }: ArrivalFacts): number | null {
  return hitsUsed < FEWEST_HITS || arrivalIqrMs === null
    ? null
    : (ERROR_OF_IQR * arrivalIqrMs) / Math.sqrt(hitsUsed);
}
