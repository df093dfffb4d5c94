import { mkdtempSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { Claim } from './measurement-claims';
import { MeasuringRuns } from './measuring-runs';

const claimOf = (measurementId: string, renewal: boolean): Claim => ({
  measurementId,
  attempt: 1,
  takeId: 'take',
  renewal,
});

/** Threads that measure until they are stopped. */
function endlessRuns() {
  const givenBack: string[] = [];
  const claims = {
    giveBack: ({ measurementId }: Claim) => Promise.resolve(givenBack.push(measurementId)),
    beat: () => Promise.resolve(true),
  };
  const stopped = ({ signal }: { signal: AbortSignal }) =>
    new Promise((_, reject) => {
      const stop = () => reject(new Error('stopped'));
      if (signal.aborted) stop();
      else signal.addEventListener('abort', stop);
    });
  const scratch = { make: () => Promise.resolve(mkdtempSync(`${tmpdir()}/runs-`)), remove: () => undefined };
  const fetcher = { fetch: () => Promise.resolve({}) };
  const config = { measuring: { heartbeatMs: 60_000 } };
  const runs = new MeasuringRuns(
    claims as never,
    fetcher as never,
    { run: stopped } as never,
    {} as never,
    scratch as never,
    config as never,
  );
  return { runs, givenBack };
}

it('renewals make way, no more than are asked for, and what somebody waits for never', async () => {
  const { runs, givenBack } = endlessRuns();
  const running = [
    runs.run(claimOf('fresh', false)),
    runs.run(claimOf('first', true)),
    runs.run(claimOf('second', true)),
  ];
  runs.makeWay(1);
  await running[1];
  expect(givenBack).toEqual(['first']);
  runs.makeWay(5);
  await running[2];
  expect(givenBack).toEqual(['first', 'second']);
  expect(runs.renewals).toEqual([]);
  runs.stopAll();
  await running[0];
  expect(givenBack).toEqual(['first', 'second', 'fresh']);
});
