import { EntityManager } from '@mikro-orm/postgresql';
import { paths, ReportResponse, reportResponse, TakeResponse, takeResponse } from '@thudline/contracts';
import { dspVersion } from '../src/measuring/dsp-version';
import { Measurement, MeasurementState } from '../src/measuring/entities/measurement.entity';
import { MeasurementClaims } from '../src/measuring/measurement-claims';
import { MeasurementRenewals, mostUnfinished } from '../src/measuring/measurement-renewals';
import { MeasureQueue } from '../src/measuring/measure-queue';
import { Report } from '../src/reports/entities/report.entity';
import { TakeFile } from '../src/takes/entities/take-file.entity';
import { listenAs } from './support/event-listener';
import { makeOldSheet, oldVersion } from './support/old-sheet';
import { Browser, joined, Person } from './support/person';
import { giveReport, shortTakeFacts } from './support/reported-take';
import { wav } from './support/recordings';
import { openedBy, sharedBy } from './support/shares';
import { startTestApp, TestApp } from './support/test-app';
import { until } from './support/until';
import { startWorker } from './support/worker-process';

jest.setTimeout(60_000);

describe('sheets of an earlier version', () => {
  let test: TestApp;
  let juno: Person;

  beforeEach(async () => {
    test = await startTestApp();
    juno = await joined(test);
  });
  afterEach(async () => test?.close());

  const parts = () => {
    const em = test.app.get(EntityManager).fork();
    const queue = test.app.get(MeasureQueue);
    return { renewals: new MeasurementRenewals(em, queue), claims: new MeasurementClaims(em, queue) };
  };
  const fill = () => parts().renewals.fill();
  const renewalsOf = (take: TakeResponse) =>
    test.em().find(Measurement, { take: take.id, renewal: true }, { orderBy: { id: 'asc' } });
  const withRenewal = async (takes: TakeResponse[]) => {
    const all = await test.em().find(Measurement, { renewal: true });
    return takes.filter(({ id }) => all.some(({ take }) => take.id === id)).map(({ number }) => number);
  };
  const read = async (take: TakeResponse) =>
    takeResponse.parse((await juno.get(paths.take(take.id)).expect(200)).body);
  const set = (take: TakeResponse, state: MeasurementState) =>
    test.em().nativeUpdate(Measurement, { take: take.id, renewal: true }, { state });

  it('are measured again, each once, however many workers look', async () => {
    const old = [await makeOldSheet(test, juno), await makeOldSheet(test, juno)];
    const current = await juno.makeTake();
    await giveReport(test, current, await shortTakeFacts());
    const bare = await juno.makeTake();
    await Promise.all([fill(), fill(), fill()]);
    await fill();
    expect(await withRenewal([...old, current, bare])).toEqual(old.map(({ number }) => number));
    expect(await test.em().count(Measurement, { renewal: true })).toBe(2);
    expect(await renewalsOf(old[0])).toMatchObject([{ dspVersion, state: 'queued', attempt: 0 }]);
  });

  it('wait behind every take that somebody waits for', async () => {
    await makeOldSheet(test, juno);
    await fill();
    await juno.makeTake();
    const jobs = await test.em().execute<{ priority: number }[]>(
      `select priority from pgboss.job where singleton_key in
         (select id::text from measurement where state = 'queued') order by created_on desc`,
    );
    expect(jobs).toHaveLength(2);
    expect(jobs[0].priority).toBeGreaterThan(jobs[1].priority);
  });

  it('do not make a player’s next take wait longer for having many of them', async () => {
    for (let i = 0; i < 3; i++) await makeOldSheet(test, juno);
    await fill();
    const { id } = await juno.makeTake();
    const [job] = await test.em().execute<{ priority: number }[]>(
      `select priority from pgboss.job where singleton_key =
         (select id::text from measurement where take_id = ?)`,
      [id],
    );
    expect(job.priority).toBe(0);
  });

  it('are taken a few at a time, of every player some', async () => {
    for (let i = 0; i < mostUnfinished + 2; i++) await makeOldSheet(test, juno);
    const oda = await joined(test, 'Oda');
    const odas = await makeOldSheet(test, oda);
    expect(await fill()).toEqual({ added: mostUnfinished, isEverything: false });
    expect(await test.em().count(Measurement, { renewal: true })).toBe(mostUnfinished);
    expect(await renewalsOf(odas)).toHaveLength(1);
    expect(await fill()).toMatchObject({ added: 0 });
    await test.em().nativeUpdate(Measurement, { renewal: true }, { state: 'failed' });
    expect(await fill()).toEqual({ added: 3, isEverything: true });
  });

  it('are left alone once they are deleted, and taken up again when they are brought back', async () => {
    const [before, meanwhile] = [await makeOldSheet(test, juno), await makeOldSheet(test, juno)];
    await juno.delete(paths.take(before.id)).expect(204);
    await fill();
    await juno.delete(paths.take(meanwhile.id)).expect(204);
    expect(await renewalsOf(before)).toEqual([]);
    expect(await renewalsOf(meanwhile)).toMatchObject([{ state: 'cancelled' }]);
    await juno.post(paths.restoreTake(meanwhile.id)).expect(200);
    await fill();
    expect((await renewalsOf(meanwhile)).map(({ state }) => state)).toEqual(['cancelled', 'queued']);
  });

  it('stay as they are where they could not be measured again, and that is tried no further', async () => {
    const take = await makeOldSheet(test, juno);
    await fill();
    expect(await parts().renewals.counts()).toEqual({ old: 1, unfinished: 1, failed: 0 });
    const [{ id }] = await renewalsOf(take);
    const claim = (await parts().claims.claim(id))!;
    await parts().claims.fail(claim, 'It broke.');
    expect(await fill()).toEqual({ added: 0, isEverything: true });
    expect(await parts().renewals.counts()).toEqual({ old: 1, unfinished: 0, failed: 1 });
    expect(await read(take)).toMatchObject({
      renewal: 'failed',
      measurement: { state: 'done', reason: null },
      sheetVersions: [{ version: oldVersion }],
    });
    await juno.post(paths.measureAgain(take.id)).expect(204);
    expect(await read(take)).toMatchObject({ measurement: { state: 'queued' } });
  });

  it('show nothing of it while it goes on', async () => {
    const take = await makeOldSheet(test, juno);
    await fill();
    await set(take, 'running');
    expect(await read(take)).toMatchObject({ renewal: 'waiting', measurement: { state: 'done' } });
    expect((await juno.get(paths.measurement(take.id))).body).toMatchObject({ state: 'done' });
    const { items } = (await juno.get(paths.takes)).body as { items: unknown[] };
    expect(items).toMatchObject([{ measurement: { state: 'done' } }]);
  });

  it('go to the front when their player asks for it', async () => {
    const take = await makeOldSheet(test, juno);
    await fill();
    await juno.post(paths.measureAgain(take.id)).expect(204);
    await juno.post(paths.measureAgain(take.id)).expect(409);
    expect(await read(take)).toMatchObject({ measurement: { state: 'queued' } });
    const [job] = await test
      .em()
      .execute<{ priority: number }[]>(
        'select priority from pgboss.job order by priority desc, created_on desc',
      );
    expect(job.priority).toBe(0);
    expect(await test.em().count(Measurement, { take: take.id })).toBe(2);
  });

  it('keep their place in the queue when a worker hands them back', async () => {
    const take = await makeOldSheet(test, juno);
    await fill();
    const [{ id }] = await renewalsOf(take);
    const { claims } = parts();
    await claims.giveBack((await claims.claim(id))!);
    await claims.retryLater((await claims.claim(id))!, 'It broke.');
    const jobs = await test.em().execute<{ priority: number; waits: number }[]>(
      `select priority, extract(epoch from start_after - created_on)::int as waits from pgboss.job
         where singleton_key = ? order by created_on`,
      [id],
    );
    expect(new Set(jobs.map(({ priority }) => priority)).size).toBe(1);
    expect(jobs.map(({ waits }) => waits)).toEqual([0, 0, 300]);
  });

  it('make way only for takes that wait although every thread could have looked', async () => {
    await makeOldSheet(test, juno);
    await test.em().execute('delete from pgboss.job');
    await fill();
    await juno.makeTake();
    const { renewals } = parts();
    expect(await renewals.overdueTakes()).toBe(0);
    await test.em().execute(`update pgboss.job set start_after = now() - interval '5 seconds'`);
    expect(await renewals.overdueTakes()).toBe(1);
  });

  it('are replaced by a real worker, which tells the open page, and can still be read', async () => {
    const take = await makeOldSheet(test, juno);
    const listener = await listenAs(test, juno, [take.id]);
    await until(() => Promise.resolve(listener.measurements(take.id).length > 0));
    const told = listener.measurements(take.id).length;
    const worker = startWorker(test);
    try {
      await until(async () => (await read(take)).renewal === 'none');
      await until(() => Promise.resolve(listener.measurements(take.id).length > told));
    } finally {
      listener.close();
      await worker.stop('SIGTERM');
    }
    expect(listener.measurements(take.id).at(-1)).toMatchObject({ measurement: { state: 'done' } });
    const { sheetVersions } = await read(take);
    expect(sheetVersions.map(({ version }) => version)).toEqual([dspVersion, oldVersion]);
    const report = async (query = '') =>
      reportResponse.parse((await juno.get(`${paths.report(take.id)}${query}`).expect(200)).body);
    expect(await report()).toMatchObject({ dspVersion, version: 2 });
    expect(await report(`?version=${oldVersion}`)).toMatchObject({
      dspVersion: oldVersion,
      version: 1,
      measuredAt: '2026-11-03T10:00:00.000Z',
    });
    expect(await test.em().count(Report, { take: take.id })).toBe(2);
    // Outlines weren't stored then; now they are.
    await juno.get(paths.peaks(take.id)).expect(200);
  });

  it('stay when a real worker finds their recordings damaged', async () => {
    const take = await makeOldSheet(test, juno);
    const [file] = await test.em().find(TakeFile, { take: take.id });
    await test.bucket.overwrite(file.objectKey, wav([new Float32Array(480)]));
    const worker = startWorker(test);
    try {
      await until(async () => (await read(take)).renewal === 'failed');
    } finally {
      await worker.stop('SIGTERM');
    }
    expect(((await juno.get(paths.report(take.id))).body as ReportResponse).dspVersion).toBe(oldVersion);
  });

  it('are told by a worker what they ask about, where that was not written beside them yet', async () => {
    const take = await juno.makeTake();
    await giveReport(test, take, await shortTakeFacts());
    await test.em().nativeUpdate(Report, { take: take.id }, { topics: null });
    const worker = startWorker(test);
    try {
      await until(async () => (await test.em().findOneOrFail(Report, { take: take.id })).topics);
    } finally {
      await worker.stop('SIGTERM');
    }
  });

  it('are measured with the version of the worker, whichever they were queued for', async () => {
    const take = await juno.makeTake();
    await test.em().nativeUpdate(Measurement, { take: take.id }, { dspVersion: oldVersion });
    const { id } = await test.em().findOneOrFail(Measurement, { take: take.id });
    await parts().claims.claim(id);
    expect(await test.em().findOneOrFail(Measurement, id)).toMatchObject({ dspVersion });
  });

  describe('that are asked for by their version', () => {
    it('are open to whoever may read the sheet; which there are is told to their player', async () => {
      const take = await makeOldSheet(test, juno);
      const guest = new Browser(test);
      await openedBy(guest, await sharedBy(juno, take));
      const seen = await guest.get(paths.take(take.id)).expect(200);
      expect(seen.body).toMatchObject({ sheetVersions: [], renewal: 'none' });
      await guest.get(`${paths.report(take.id)}?version=${oldVersion}`).expect(200);
      const oda = await joined(test, 'Oda');
      await oda.get(`${paths.report(take.id)}?version=${oldVersion}`).expect(404);
      await new Browser(test).get(`${paths.report(take.id)}?version=${oldVersion}`).expect(401);
    });

    it('are not found where there is no such version, nor is their pair spectrum', async () => {
      const take = await makeOldSheet(test, juno);
      for (const path of [paths.report(take.id), paths.pairSpectrum(take.id)]) {
        const refused = await juno.get(`${path}?version=77`).expect(404);
        expect(refused.body).toMatchObject({
          code: 'not-found',
          message: 'This take was not measured with that version of the measurements.',
        });
        await juno.get(`${path}?version=${'7'.repeat(41)}`).expect(400);
      }
    });
  });
});
