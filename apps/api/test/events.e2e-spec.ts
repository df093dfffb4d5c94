import { paths, TakeResponse } from '@thudline/contracts';
import { EventStreams } from '../src/events/event-streams';
import { Measurement } from '../src/measuring/entities/measurement.entity';
import { EventListener, listenAs } from './support/event-listener';
import { Browser, joined, Person } from './support/person';
import { startTestApp, TestApp } from './support/test-app';
import { until } from './support/until';
import { startWorker } from './support/worker-process';

describe('events', () => {
  let test: TestApp;
  let juno: Person;
  let take: TakeResponse;
  let open: EventListener[] = [];

  beforeAll(async () => {
    test = await startTestApp();
    juno = await joined(test);
  });
  beforeEach(async () => {
    take = await juno.makeTake();
  });
  afterEach(() => {
    open.forEach((listener) => listener.close());
    open = [];
  });
  afterAll(async () => test?.close());

  const listen = async (person: Person, takeIds: string[] = []) => {
    const listener = await listenAs(test, person, takeIds);
    open.push(listener);
    return listener;
  };
  const change = (changes: Partial<Measurement>) =>
    test.em().nativeUpdate(Measurement, { take: take.id }, changes);
  const last = (listener: EventListener) => listener.measurements(take.id).at(-1);

  it('begin with the full state of every take that is named', async () => {
    const other = await juno.makeTake();
    const listener = await listen(juno, [take.id, other.id]);
    expect(listener.headers).toMatchObject({
      'content-type': 'text/event-stream; charset=utf-8',
      'cache-control': 'no-cache, no-transform',
    });
    await until(() => Promise.resolve(last(listener) && listener.measurements(other.id).length === 1));
    const measurement = { state: 'queued', stage: null, progress: 0, attempt: 0, reason: null };
    expect(last(listener)).toEqual({ takeId: take.id, measurement, hasReport: false });
  });

  it('tell what changes from then on, whoever changes it', async () => {
    const listener = await listen(juno, [take.id]);
    await change({ state: 'running', stage: 'levels', progress: 0.4, attempt: 1 });
    await until(() => Promise.resolve(last(listener)?.measurement.progress === 0.4));
    await juno.post(paths.cancelMeasurement(take.id)).expect(204);
    await until(() => Promise.resolve(last(listener)?.measurement.state === 'cancelled'));
    const states = listener.measurements(take.id).map(({ measurement }) => measurement.state);
    expect([...new Set(states)].slice(-2)).toEqual(['running', 'cancelled']);
  });

  it('say nothing of another player’s take, nor of one that was not named', async () => {
    const oda = await joined(test, 'Oda');
    const unnamed = await juno.makeTake();
    const [hers, his] = [await listen(oda, [take.id]), await listen(juno, [take.id])];
    await test.em().nativeUpdate(Measurement, { take: unnamed.id }, { state: 'failed' });
    await change({ state: 'running', stage: 'levels', progress: 0.5 });
    await until(() => Promise.resolve(last(his)?.measurement.progress === 0.5));
    expect(hers.measurements(take.id)).toEqual([]);
    expect(his.measurements(unnamed.id)).toEqual([]);
  });

  it('tell of takes that are added, to their player only', async () => {
    const oda = await joined(test, 'Oda');
    const [his, hers] = [await listen(juno), await listen(oda)];
    const next = await juno.makeTake({ followsTakeId: take.id });
    const odas = await oda.makeTake();
    await until(() => Promise.resolve(his.added().length > 0 && hers.added().length > 0));
    expect(his.added()).toEqual([{ takeId: next.id, followsTakeId: take.id }]);
    expect(hers.added()).toEqual([{ takeId: odas.id, followsTakeId: null }]);
  });

  it('go on after the connection that listens was lost, with the state of by then', async () => {
    const listener = await listen(juno, [take.id]);
    await until(() => Promise.resolve(last(listener)));
    await test.em().execute(
      `select pg_terminate_backend(pid) from pg_stat_activity
         where application_name = 'thudline-events' and datname = current_database()`,
    );
    await change({ state: 'running', stage: 'hits', progress: 0.8 });
    await until(() => Promise.resolve(last(listener)?.measurement.progress === 0.8));
  });

  it('end with the session', async () => {
    const leaver = await joined(test, 'Leaver');
    const [his, hers] = [await listen(juno), await listen(leaver)];
    const streams = test.app.get(EventStreams, { strict: false });
    await streams.beat();
    expect(hers.isOver()).toBe(false);
    await leaver.post(paths.signOut).expect(204);
    await streams.beat();
    await until(() => Promise.resolve(hers.isOver()));
    expect(his.isOver()).toBe(false);
  });

  it('follow a real worker to the sheet', async () => {
    const listener = await listen(juno, [take.id]);
    const worker = startWorker(test);
    try {
      await until(() => Promise.resolve(last(listener)?.measurement.state === 'done'));
    } finally {
      await worker.stop('SIGTERM');
    }
    expect(last(listener)).toMatchObject({ hasReport: true, measurement: { progress: 1 } });
  });

  it('are refused signed out, and for what is no list of takes', async () => {
    await new Browser(test).get(paths.events).expect(401);
    await juno.get(`${paths.events}?takes=nonsense`).expect(400);
  });
});

it('event streams do not keep a server from closing', async () => {
  const test = await startTestApp();
  const listener = await listenAs(test, await joined(test)).catch((error: unknown) => error as Error);
  await test.close();
  if (listener instanceof Error) throw listener;
  await until(() => Promise.resolve(listener.isOver()));
});
