import { join } from 'node:path';

/**
 * Prints what each rule was designed to reach beside what it reaches on made takes. Ends with 1 where one doesn't.
 *
 * Run by `npm run check:truth`.
 */
interface Row {
  readonly figure: string;
  readonly wanted: string;
  readonly reached: string;
  readonly isReached: boolean;
}

/** What tests are made of isn't part of the package, so it is taken from its build. */
const table = join(__dirname, '../../dsp/dist/testing/truths/truthTable.js');

async function check(): Promise<void> {
  const { truthTable } = (await import(table)) as { truthTable: () => AsyncIterable<Row> };
  const line = (figure: string, wanted: string, reached: string, verdict: string): string =>
    `${figure.padEnd(58)}${wanted.padStart(14)}${reached.padStart(14)}  ${verdict}`;
  console.log(line('figure', 'wanted', 'reached', ''));
  let failures = 0;
  for await (const { figure, wanted, reached, isReached } of truthTable()) {
    if (!isReached) failures += 1;
    console.log(line(figure, wanted, reached, isReached ? 'pass' : 'FAIL'));
  }
  console.log(failures === 0 ? 'as wanted' : 'NOT as wanted');
  process.exitCode = failures === 0 ? 0 : 1;
}

void check();
