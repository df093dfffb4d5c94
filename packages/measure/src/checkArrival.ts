import { join } from 'node:path';

/**
 * Measures the arrival of every made take there is and prints it beside the truth. Ends with 1 where a confidence of 0.7 or
 * more stands beside an error above 0.3 ms, or where the accuracy wanted on made takes isn't reached. Where something struck
 * with every kick hides it, nothing but the confidence is judged.
 *
 * Run by `npm run check:arrival`.
 */
interface Row {
  readonly name: string;
  readonly isHidden: boolean;
  readonly arrival: { readonly confidence: number; readonly reason: string | null };
  readonly errorMs: number | null;
}

/** docs/measurements.md, 4: 0.05 ms in the median, 0.3 ms in 95 %. */
const wanted = { medianMs: 0.05, withinMs: 0.3, share: 0.95, sureFrom: 0.7 };
/** What tests are made of isn't part of the package, so it is taken from its build. */
const testing = join(__dirname, '../../dsp/dist/testing');

function printed({ name, arrival, errorMs }: Row): boolean {
  const isOff = errorMs !== null && Math.abs(errorMs) > wanted.withinMs;
  const isBroken = isOff && arrival.confidence >= wanted.sureFrom;
  const error = errorMs === null ? (arrival.reason ?? '') : errorMs.toFixed(3);
  const remark = isBroken ? 'FAIL' : isOff ? 'off, and not sure' : '';
  console.log(
    `${name.padEnd(46)}${error.padStart(14)}${arrival.confidence.toFixed(2).padStart(8)}  ${remark}`,
  );
  return !isBroken;
}

async function check(): Promise<void> {
  const { arrivalCases } = (await import(join(testing, 'arrivalCases.js'))) as { arrivalCases: unknown[] };
  const { arrivalRow } = (await import(join(testing, 'arrivalTable.js'))) as {
    arrivalRow: (each: unknown) => Promise<Row>;
  };
  console.log(`${'case'.padEnd(46)}${'error ms'.padStart(14)}${'sure'.padStart(8)}`);
  const errorsMs: number[] = [];
  let isSound = true;
  let told = 0;
  for (const each of arrivalCases) {
    const row = await arrivalRow(each);
    isSound = printed(row) && isSound;
    told += row.errorMs === null ? 0 : 1;
    if (row.errorMs !== null && !row.isHidden) errorsMs.push(Math.abs(row.errorMs));
  }
  errorsMs.sort((a, b) => a - b);
  const medianMs = errorsMs[Math.floor(errorsMs.length / 2)] ?? Infinity;
  const share = errorsMs.filter((errorMs) => errorMs <= wanted.withinMs).length / errorsMs.length;
  console.log(
    `${told} of ${arrivalCases.length} told; of ${errorsMs.length} where the kick isn't hidden: median error ${medianMs.toFixed(3)} ms, ${(100 * share).toFixed(1)} % within ${wanted.withinMs} ms`,
  );
  const isWithin = isSound && medianMs <= wanted.medianMs && share >= wanted.share;
  console.log(isWithin ? 'as wanted' : 'NOT as wanted');
  process.exitCode = isWithin ? 0 : 1;
}

void check();
