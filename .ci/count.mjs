/**
 * Adds up what jest, Playwright and the single checks wrote into a folder, and says `N passed, N failed` last.
 * A report that is missing, or that ran nothing, counts as one failure: green because nothing ran is not green.
 */
import { readFileSync, readdirSync } from 'node:fs';
import { join } from 'node:path';

const folder = process.argv[2];
const total = { passed: 0, failed: 0 };

function add(name, { passed, failed }) {
  console.log(`${name}: ${passed} passed, ${failed} failed`);
  total.passed += passed;
  total.failed += failed;
}

function addReport(name, file, count) {
  let counted;
  try {
    counted = count(JSON.parse(readFileSync(join(folder, file), 'utf8')));
  } catch (error) {
    console.log(`${name}: no readable report (${error.message})`);
    counted = { passed: 0, failed: 1 };
  }
  if (counted.passed + counted.failed === 0) counted.failed = 1;
  add(name, counted);
}

console.log('');
// A spec file that can't even be loaded has no failed tests of its own.
addReport('jest', 'jest.json', (report) => ({
  passed: report.numPassedTests,
  failed: report.numFailedTests + report.numRuntimeErrorTestSuites,
}));
// `flaky` passed only when tried again; errors outside of tests (a harness that did not start) are counted too.
addReport('browser', 'playwright.json', ({ stats, errors = [] }) => ({
  passed: stats.expected,
  failed: stats.unexpected + stats.flaky + errors.length,
}));
for (const file of readdirSync(folder).filter((name) => name.endsWith('.check'))) {
  const passed = readFileSync(join(folder, file), 'utf8').trim() === 'passed';
  add(file.slice(0, -'.check'.length), passed ? { passed: 1, failed: 0 } : { passed: 0, failed: 1 });
}

console.log(`${total.passed} passed, ${total.failed} failed`);
process.exitCode = total.failed === 0 && total.passed > 0 ? 0 : 1;
