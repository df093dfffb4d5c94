import { kicksAmongToms, kicksInSixteenths, type KicksFound } from './kicksFound';
import { lateStartErrorsMs, LATE_STARTS_MS } from './lateStarts';
import { lowCutErrorDb } from './lowCutError';
import { verdictsTold } from './twoPasses';

/** One figure that a rule was designed to reach, and what it reaches. */
export interface TruthRow {
  readonly figure: string;
  readonly wanted: string;
  readonly reached: string;
  readonly isReached: boolean;
}

const LOW_CUT_WITHIN_DB = 0.1;
const LATE_WITHIN_MS = 5;
const SOFT_RECALL = 0.88;
const FALSE_SHARE = 0.02;

/** Tries every figure on made takes whose truth is known (docs/decisions/0014-figures-of-the-rules.md). */
export async function* truthTable(): AsyncGenerator<TruthRow> {
  yield kickRow('kicks among low toms', kicksAmongToms({ isSofter: false }), 1);
  yield kickRow('soft kicks among low toms', kicksAmongToms({ isSofter: true }), SOFT_RECALL);
  yield kickRow('sixteenths at 220 beats per minute', kicksInSixteenths(), 1);
  yield lateStartRow();
  for (const [kicks, pairs] of [
    [8, 60],
    [4, 30],
    [16, 15],
  ] as const)
    yield await passesRow(kicks, pairs);
  yield await lowCutRow();
}

function kickRow(name: string, { precision, recall }: KicksFound, leastRecall: number): TruthRow {
  return {
    figure: `${name}: precision, recall`,
    wanted: `1.00 ${leastRecall.toFixed(2)}`,
    reached: `${precision.toFixed(2)} ${recall.toFixed(2)}`,
    isReached: precision === 1 && recall >= leastRecall,
  };
}

function lateStartRow(): TruthRow {
  const errorsMs = lateStartErrorsMs();
  const found = errorsMs.filter((errorMs) => errorMs < LATE_WITHIN_MS).length;
  return {
    figure: `files that don't start together, within ${LATE_WITHIN_MS} ms`,
    wanted: `${LATE_STARTS_MS.length} of ${LATE_STARTS_MS.length}`,
    reached: `${found} of ${errorsMs.length}`,
    isReached: found === LATE_STARTS_MS.length,
  };
}

async function passesRow(kicks: number, pairs: number): Promise<TruthRow> {
  const { apart, together } = await verdictsTold({ pairs, kicks });
  return {
    figure: `${kicks} kicks: false verdicts on two passes, right ones on one`,
    wanted: `${100 * FALSE_SHARE} % ${pairs} of ${pairs}`,
    reached: `${((100 * apart) / pairs).toFixed(0)} % ${together} of ${pairs}`,
    isReached: apart <= FALSE_SHARE * pairs && together === pairs,
  };
}

async function lowCutRow(): Promise<TruthRow> {
  const errorsDb = [await lowCutErrorDb(0.5), await lowCutErrorDb(1.6), await lowCutErrorDb(4)];
  const worstDb = Math.max(...errorsDb);
  return {
    figure: 'low cut from the spectrum beside a filter',
    wanted: `${LOW_CUT_WITHIN_DB} dB`,
    reached: `${worstDb.toFixed(3)} dB`,
    isReached: worstDb < LOW_CUT_WITHIN_DB,
  };
}
