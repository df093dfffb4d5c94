import { listTakesResponse, ListTakesResponse, paths, TakeResponse } from '@thudline/contracts';
import { AuditEvent } from '../src/audit/entities/audit-event.entity';
import { Measurement } from '../src/measuring/entities/measurement.entity';
import { Take } from '../src/takes/entities/take.entity';
import { joined, Person } from './support/person';
import { giveReport, shortTakeFacts } from './support/reported-take';
import { startTestApp, TestApp } from './support/test-app';

describe('takes', () => {
  let test: TestApp;
  let juno: Person;
  const nothing = {
    items: [],
    nextCursor: null,
    total: 0,
    everyTotal: 0,
    deletedTotal: 0,
    tags: [],
    setups: [],
  };

  beforeAll(async () => {
    test = await startTestApp();
  });
  beforeEach(async () => {
    juno = await joined(test);
  });
  afterAll(async () => test?.close());

  const list = async (query = ''): Promise<ListTakesResponse> => {
    const response = await juno.get(`${paths.takes}${query}`).expect(200);
    return listTakesResponse.parse(response.body);
  };

  describe('the list', () => {
    it('is empty for a new player', async () => {
      expect(await list()).toEqual(nothing);
    });

    it('shows only the player’s own takes, newest recording first', async () => {
      await (await joined(test, 'Oda')).makeTake();
      await juno.makeTake({ title: 'middle', recordedAt: '2026-05-02T10:00:00Z' });
      await juno.makeTake({ title: 'old', recordedAt: '2025-05-02T10:00:00+02:00' });
      await juno.makeTake({ title: 'new', recordedAt: '2026-11-02T10:00:00Z' });
      const { items, total } = await list();
      expect(items.map((item) => item.title)).toEqual(['new', 'middle', 'old']);
      expect(items[2].recordedAt).toBe('2025-05-02T08:00:00.000Z');
      expect(total).toBe(3);
      expect(items[0]).toMatchObject({
        measurement: { state: 'queued' },
        summary: null,
        kickPeakDbfs: null,
        lowEndDb: null,
      });
    });

    it('pages without losing or repeating a take, also when many were recorded at the same moment', async () => {
      const recordedAt = '2026-05-02T10:00:00.123Z';
      for (let i = 0; i < 5; i++) await juno.makeTake({ recordedAt });
      await juno.makeTake({ recordedAt: '2026-05-01T10:00:00Z' });
      const seen: string[] = [];
      let cursor: string | null = '';
      while (cursor !== null) {
        const page: ListTakesResponse = await list(`?limit=2${cursor ? `&cursor=${cursor}` : ''}`);
        expect(page.total).toBe(6);
        seen.push(...page.items.map((item) => item.id));
        cursor = page.nextCursor;
      }
      expect(seen).toHaveLength(6);
      expect(new Set(seen).size).toBe(6);
    });

    it('refuses a limit and a cursor that make no sense', async () => {
      await juno.get(`${paths.takes}?limit=0`).expect(400);
      await juno.get(`${paths.takes}?limit=many`).expect(400);
      const response = await juno.get(`${paths.takes}?cursor=nonsense`).expect(400);
      expect(response.body).toMatchObject({ code: 'bad-request' });
    });
  });

  describe('changing a take', () => {
    it('changes what is named and leaves the rest', async () => {
      const take = await juno.makeTake({ title: 'Before', note: 'Kept.' });
      const changed = await juno
        .patch(paths.take(take.id), { title: ' After ', tickedActions: ['flip-overhead'] })
        .expect(200);
      expect(changed.body).toMatchObject({ title: 'After', note: 'Kept.', tickedActions: ['flip-overhead'] });
      const read = await juno.get(paths.take(take.id)).expect(200);
      expect(read.body).toEqual(changed.body);
      await juno.patch(paths.take(take.id), { tickedActions: [] }).expect(200);
      expect((await juno.get(paths.take(take.id))).body).toMatchObject({ title: 'After', tickedActions: [] });
    });

    it('refuses a title that is too long, in a sentence', async () => {
      const take = await juno.makeTake({ title: 'Before' });
      const response = await juno.patch(paths.take(take.id), { title: 'x'.repeat(121) }).expect(400);
      expect(response.body).toMatchObject({
        message: 'A title has at most 120 characters.',
        details: { fields: { title: 'A title has at most 120 characters.' } },
      });
      expect(((await juno.get(paths.take(take.id))).body as TakeResponse).title).toBe('Before');
    });

    it('refuses a body that is not JSON', async () => {
      const take = await juno.makeTake();
      const response = await juno
        .written(juno.agent.patch(paths.take(take.id)))
        .type('json')
        .send('{"title":')
        .expect(400);
      expect(response.body).toMatchObject({ code: 'bad-request' });
    });
  });

  describe('deleting a take', () => {
    it('takes it out of the list and the count, keeps its row and its number', async () => {
      const take = await juno.makeTake();
      await juno.delete(paths.take(take.id)).expect(204);
      expect(await list()).toEqual({ ...nothing, deletedTotal: 1 });
      await juno.get(paths.take(take.id)).expect(404);
      const row = await test.em().findOneOrFail(Take, { id: take.id });
      expect(row.deletedAt).toBeInstanceOf(Date);
      expect((await juno.makeTake()).number).toBe(2);
      expect(await test.em().count(AuditEvent, { kind: 'take-deleted', subjectId: take.id })).toBe(1);
    });
  });

  describe('bringing a take back', () => {
    it('puts it where it was, and is no error twice', async () => {
      const take = await juno.makeTake({ title: 'Back again', tags: ['felt'] });
      await giveReport(test, take, await shortTakeFacts());
      await juno.delete(paths.take(take.id)).expect(204);
      const restored = await juno.post(paths.restoreTake(take.id)).expect(200);
      expect(restored.body).toMatchObject({ id: take.id, title: 'Back again', hasReport: true });
      await juno.post(paths.restoreTake(take.id)).expect(200);
      expect((await list()).items.map(({ id }) => id)).toEqual([take.id]);
      await juno.get(paths.report(take.id)).expect(200);
      expect(await test.em().count(AuditEvent, { kind: 'take-restored', subjectId: take.id })).toBe(1);
    });

    it('has it measured where that was broken off', async () => {
      const take = await juno.makeTake();
      await juno.delete(paths.take(take.id)).expect(204);
      expect(await test.em().count(Measurement, { take: take.id, state: 'queued' })).toBe(0);
      const restored = await juno.post(paths.restoreTake(take.id)).expect(200);
      expect(restored.body).toMatchObject({ measurement: { state: 'queued', attempt: 0 } });
    });
  });

  describe('measuring again', () => {
    const again = (take: TakeResponse) => juno.post(paths.measureAgain(take.id));
    const measurementsOf = (take: TakeResponse) =>
      test.em().find(Measurement, { take: take.id }, { orderBy: { id: 'asc' } });

    it('adds a measurement after one that was cancelled or failed, and keeps what there was', async () => {
      const take = await juno.makeTake();
      await juno.post(paths.cancelMeasurement(take.id)).expect(204);
      await again(take).expect(204);
      await test.em().nativeUpdate(Measurement, { take: take.id, state: 'queued' }, { state: 'failed' });
      await again(take).expect(204);
      const states = (await measurementsOf(take)).map(({ state }) => state);
      expect(states).toEqual(['cancelled', 'failed', 'queued']);
      expect((await juno.get(paths.measurement(take.id))).body).toMatchObject({ state: 'queued' });
      const jobs = await test
        .em()
        .execute('select 1 from pgboss.job where singleton_key = ?', [(await measurementsOf(take))[2].id]);
      expect(jobs).toHaveLength(1);
    });

    it('is refused while it is measured, and where it would find the same', async () => {
      const take = await juno.makeTake();
      const waiting = await again(take).expect(409);
      expect(waiting.body).toMatchObject({ code: 'conflict' });
      await giveReport(test, take, await shortTakeFacts());
      await again(take).expect(409);
      expect(await measurementsOf(take)).toHaveLength(1);
    });

    it('is one measurement when it is asked for twice at the same moment', async () => {
      const take = await juno.makeTake();
      await juno.post(paths.cancelMeasurement(take.id)).expect(204);
      const statuses = (await Promise.all([again(take), again(take)])).map(({ status }) => status);
      expect(statuses.sort()).toEqual([204, 409]);
    });

    it('keeps the sheet of an older version until the new one is there', async () => {
      const take = await juno.makeTake();
      await giveReport(test, take, await shortTakeFacts());
      await test.em().nativeUpdate(Measurement, { take: take.id }, { dspVersion: '0' });
      await again(take).expect(204);
      const read = await juno.get(paths.take(take.id)).expect(200);
      expect(read.body).toMatchObject({ hasReport: true, measurement: { state: 'queued' } });
      expect((await juno.get(paths.report(take.id))).body).toMatchObject({ dspVersion: '0' });
    });
  });

  describe('a measurement', () => {
    it('can be read, and cancelled for good while it waits', async () => {
      const take = await juno.makeTake();
      const waiting = await juno.get(paths.measurement(take.id)).expect(200);
      expect(waiting.body).toEqual({ state: 'queued', stage: null, progress: 0, attempt: 0, reason: null });
      await juno.post(paths.cancelMeasurement(take.id)).expect(204);
      await juno.post(paths.cancelMeasurement(take.id)).expect(204);
      expect((await juno.get(paths.measurement(take.id))).body).toMatchObject({ state: 'cancelled' });
    });

    it('from before outlines were stored has none, and says how to get one', async () => {
      const take = await juno.makeTake();
      await giveReport(test, take, await shortTakeFacts());
      const response = await juno.get(paths.peaks(take.id)).expect(404);
      expect(response.body).toMatchObject({
        code: 'not-found',
        message: expect.stringContaining('again') as string,
      });
    });

    it('that is not done has no report and no pair spectrum', async () => {
      const take = await juno.makeTake();
      for (const path of [paths.report(take.id), paths.pairSpectrum(take.id), paths.peaks(take.id)]) {
        const response = await juno.get(path).expect(404);
        expect(response.body).toMatchObject({ code: 'not-measured-yet' });
      }
    });
  });
});
