import {
  listTakesResponse,
  MeasurementResponse,
  paths,
  ReportResponse,
  reportResponse,
  TakeResponse,
} from '@thudline/contracts';
import {
  bytesSource,
  decodeOutline,
  decodePairSpectrum,
  encodeWav,
  measureTake,
  openWav,
  takeSummary,
} from '@thudline/dsp';
import { getScenario, synthesiseTake } from '@thudline/fixtures';
import { EntityManager } from '@mikro-orm/postgresql';
import { Measurement } from '../src/measuring/entities/measurement.entity';
import { Measured, MeasurementClaims } from '../src/measuring/measurement-claims';
import { MeasureQueue } from '../src/measuring/measure-queue';
import { MeasurementSweep } from '../src/measuring/measurement-sweep';
import { Report } from '../src/reports/entities/report.entity';
import { ObjectStoreService } from '../src/storage/object-store.service';
import { TakeFile } from '../src/takes/entities/take-file.entity';
import { joined, Person } from './support/person';
import { monoTracks, shortTake, UploadFile, wav } from './support/recordings';
import { startTestApp, TestApp } from './support/test-app';
import { until } from './support/until';
import { startWorker, WorkerProcess } from './support/worker-process';

jest.setTimeout(60_000);

const { sampleRateHz, kick, overhead } = synthesiseTake(getScenario('hot-kick-opposite-overhead').parameters);

function filesOf(tracks: Float32Array[]): UploadFile[] {
  const names = ['kick.wav', 'overhead.wav'];
  return tracks.map((samples, index) => ({
    name: names[index],
    bytes: encodeWav({ channels: [samples], sampleRateHz, bitDepth: 24 }),
  }));
}

/** Long enough that a worker can be stopped while it measures. */
function repeated(samples: Float32Array, times: number): Float32Array {
  const long = new Float32Array(samples.length * times);
  for (let i = 0; i < times; i++) long.set(samples, i * samples.length);
  return long;
}

/** What a worker would find in the short take: hardly anything, but whole facts. */
async function measuredTones(): Promise<Measured> {
  const tracks = await Promise.all(
    shortTake().files.map(async ({ bytes }, index) => ({
      role: monoTracks[index].role,
      source: (await openWav(bytesSource(bytes))).track(0),
    })),
  );
  return { facts: (await measureTake({ tracks })).facts, spectra: [null] };
}

const groove = { files: filesOf([kick, overhead]), tracks: monoTracks };
const longGroove = { files: filesOf([repeated(kick, 6), repeated(overhead, 6)]), tracks: monoTracks };

describe('measuring', () => {
  let test: TestApp;
  let juno: Person;
  let workers: WorkerProcess[] = [];

  beforeAll(async () => {
    test = await startTestApp();
    juno = await joined(test);
  });
  afterEach(async () => {
    await Promise.all(workers.map((worker) => worker.stop('SIGKILL')));
    workers = [];
  });
  afterAll(async () => test?.close());

  const worker = () => {
    const started = startWorker(test);
    workers.push(started);
    return started;
  };
  const measurementOf = async (take: TakeResponse) =>
    (await juno.get(paths.measurement(take.id)).expect(200)).body as MeasurementResponse;
  const reaches = (take: TakeResponse, ...states: MeasurementResponse['state'][]) =>
    until(async () => {
      const measurement = await measurementOf(take);
      return states.includes(measurement.state) && measurement;
    });
  const reportsOf = (take: TakeResponse) => test.em().count(Report, { take: take.id });

  describe('with a worker', () => {
    let steady: WorkerProcess;
    let take: TakeResponse;

    beforeAll(async () => {
      steady = startWorker(test);
      take = await juno.makeTake({ ...groove, title: 'Star' });
      await reaches(take, 'done', 'failed');
    });
    afterAll(async () => steady?.stop('SIGKILL'));

    it('gives a take a report that says what the sheet says, judged by the owner’s target', async () => {
      expect(await measurementOf(take)).toEqual({
        state: 'done',
        stage: null,
        progress: 1,
        attempt: 1,
        reason: null,
      });
      const report = reportResponse.parse((await juno.get(paths.report(take.id)).expect(200)).body);
      expect(report).toMatchObject({
        takeId: take.id,
        target: juno.me.settings.target,
        temperatureC: 20,
        sampleRateHz,
        agreement: { verdict: 'flip' },
        kick: { level: 'hot' },
      });
      expect(report.hits.length).toBeGreaterThan(10);
      expect(report.line.length).toBeGreaterThan(0);
      expect(report.actions.map((action) => action.id)).toContain('flip-overhead');
      expect((await juno.get(paths.take(take.id))).body).toMatchObject({ hasReport: true });
    });

    it('gives it a pair spectrum of the size the report names, sent once', async () => {
      const { pairSpectrum } = reportResponse.parse((await juno.get(paths.report(take.id))).body);
      const response = await juno.get(paths.pairSpectrum(take.id)).responseType('arraybuffer').expect(200);
      const spectrum = decodePairSpectrum(new Uint8Array(response.body as Buffer), pairSpectrum!);
      expect(spectrum.skk).toHaveLength(pairSpectrum!.binCount);
      expect(Math.max(...spectrum.skk)).toBeGreaterThan(0);
      const { etag } = response.headers as { etag: string };
      await juno.get(paths.pairSpectrum(take.id)).set('If-None-Match', etag).expect(304);
    });

    it('gives it outlines in several resolutions, of which it sends the one that is asked for', async () => {
      const peaks = (steps: number) =>
        juno.get(`${paths.peaks(take.id)}?steps=${steps}`).responseType('arraybuffer');
      const { durationS } = reportResponse.parse((await juno.get(paths.report(take.id))).body);
      const coarse = await peaks(300).expect(200);
      expect(coarse.headers).toMatchObject({
        'x-steps': '500',
        'x-tracks': '2',
        'x-duration-s': String(durationS),
      });
      const outline = decodeOutline(new Uint8Array(coarse.body as Buffer), { steps: 500, tracks: 2 });
      const loudest = kick.reduce((peak, sample) => Math.max(peak, Math.abs(sample)), 0);
      expect(Math.max(...outline.tracks[0].map(Math.abs))).toBe(Math.round(127 * loudest));
      expect((await peaks(1500).expect(200)).headers['x-steps']).toBe('2000');
      const { etag } = coarse.headers as { etag: string };
      await peaks(300).set('If-None-Match', etag).expect(304);
      await juno.get(`${paths.peaks(take.id)}?steps=9`).expect(400);
    });

    it('lists it with the same summary as its sheet, from columns that hold no hits', async () => {
      const report = reportResponse.parse((await juno.get(paths.report(take.id))).body);
      const { items } = listTakesResponse.parse((await juno.get(paths.takes)).body);
      expect(items.find((item) => item.id === take.id)).toMatchObject({
        // The contract is wider than what dsp gives: its reasons are any text.
        summary: takeSummary(report as Parameters<typeof takeSummary>[0]),
        kickPeakDbfs: report.kick.loudestHitDbfs,
        kickClipped: false,
        lowEndDb: report.agreement.choices.find((choice) => choice.name === 'as-recorded')?.lowEndDb,
      });
      const row = await test.em().findOneOrFail(Report, { take: take.id });
      expect(row.summary.hits).toEqual([]);
    });

    it('shows nothing of it to another player', async () => {
      const oda = await joined(test, 'Oda');
      for (const path of [paths.report(take.id), paths.pairSpectrum(take.id), paths.listen(take.id)]) {
        await oda.get(path).expect(404);
      }
    });

    it('says of the take that follows what became of the actions that were carried out', async () => {
      const flipped = { files: filesOf([kick, overhead.map((sample) => -sample)]), tracks: monoTracks };
      const before = await juno.makeTake(groove);
      const follows = { ...flipped, followsTakeId: before.id };
      const after = await juno.makeTake({ ...follows, doneActions: ['flip-overhead'] });
      const nothingDone = await juno.makeTake(follows);
      for (const each of [before, after, nothingDone]) await reaches(each, 'done', 'failed');
      const outcomesOf = async (each: TakeResponse) =>
        reportResponse.parse((await juno.get(paths.report(each.id)).expect(200)).body).outcomes;
      expect(await outcomesOf(after)).toEqual([
        {
          actionId: 'flip-overhead',
          status: 'good',
          strong: 'The flip worked:',
          rest: expect.stringMatching(/dB of low end came back/) as string,
        },
      ]);
      const { line } = (await juno.get(paths.report(after.id))).body as ReportResponse;
      expect(line[0].action).toBe('The flip worked:');
      expect(await outcomesOf(before)).toEqual([]);
      expect(await outcomesOf(nothingDone)).toEqual([]);
      await juno.delete(paths.take(before.id)).expect(204);
      expect(await outcomesOf(after)).toEqual([]);
    });

    it('measures silence, and says that it cannot tell', async () => {
      const take = await juno.makeTake({
        files: ['kick.wav', 'overhead.wav'].map((name) => ({ name, bytes: wav([new Float32Array(96_000)]) })),
      });
      expect(await reaches(take, 'done', 'failed')).toMatchObject({ state: 'done' });
      const report = reportResponse.parse((await juno.get(paths.report(take.id)).expect(200)).body);
      expect(report.agreement.verdict).toBe('cannot-tell');
      expect(report.pairSpectrum).toBeNull();
      await juno.get(paths.pairSpectrum(take.id)).expect(404);
    });

    it('fails with a sentence when the stored recording is not what was uploaded', async () => {
      const take = await juno.makeTake(groove);
      const [file] = await test.em().find(TakeFile, { take: take.id });
      await test.bucket.overwrite(file.objectKey, wav([new Float32Array(480)]));
      expect(await reaches(take, 'done', 'failed')).toMatchObject({
        state: 'failed',
        reason: 'The stored recordings of this take are damaged. Upload it again.',
      });
      await juno.get(paths.report(take.id)).expect(404);
    });

    it('fails with a sentence when the stored recording is gone', async () => {
      const take = await juno.makeTake(groove);
      const [file] = await test.em().find(TakeFile, { take: take.id });
      await test.app.get(ObjectStoreService, { strict: false }).removeAll(file.objectKey);
      expect(await reaches(take, 'done', 'failed')).toMatchObject({
        state: 'failed',
        reason: 'The stored recordings of this take are damaged. Upload it again.',
      });
    });

    it('takes up a take whose job was lost', async () => {
      const take = await juno.makeTake(groove);
      await test.em().getConnection().execute('delete from pgboss.job');
      expect(await reaches(take, 'done', 'failed')).toMatchObject({ state: 'done', attempt: 1 });
    });
  });

  it('goes on in another worker when one is killed in the middle, and makes one report', async () => {
    const take = await juno.makeTake(longGroove);
    const first = worker();
    await reaches(take, 'running', 'done');
    await first.stop('SIGKILL');
    expect(await measurementOf(take)).toMatchObject({ state: 'running', attempt: 1 });
    worker();
    worker();
    expect(await reaches(take, 'done', 'failed')).toMatchObject({ state: 'done', attempt: 2 });
    expect(await reportsOf(take)).toBe(1);
    await juno.get(paths.report(take.id)).expect(200);
  });

  it('is handed back at once when its worker is asked to stop', async () => {
    const take = await juno.makeTake(longGroove);
    const first = worker();
    await reaches(take, 'running', 'done');
    await first.stop('SIGTERM');
    expect(await measurementOf(take)).toMatchObject({ state: 'queued', attempt: 0, stage: null });
    worker();
    expect(await reaches(take, 'done', 'failed')).toMatchObject({ state: 'done', attempt: 1 });
  });

  it('stops when the player cancels, and the worker goes on with the next take', async () => {
    const cancelled = await juno.makeTake(longGroove);
    const next = await juno.makeTake(groove);
    worker();
    await reaches(cancelled, 'running', 'done');
    await juno.post(paths.cancelMeasurement(cancelled.id)).expect(204);
    expect(await reaches(next, 'done', 'failed')).toMatchObject({ state: 'done' });
    expect(await measurementOf(cancelled)).toMatchObject({ state: 'cancelled' });
    expect(await reportsOf(cancelled)).toBe(0);
  });

  describe('a claim', () => {
    const parts = () => {
      const em = test.app.get(EntityManager).fork();
      const queue = test.app.get(MeasureQueue);
      return {
        claims: new MeasurementClaims(em, queue),
        sweep: new MeasurementSweep(em, queue, test.config),
      };
    };
    const longAgo = new Date(Date.now() - 60_000);
    const claimed = async () => {
      const take = await juno.makeTake();
      const { id } = await test.em().findOneOrFail(Measurement, { take: take.id });
      const claim = await parts().claims.claim(id);
      if (!claim) throw new Error('The measurement was claimed by somebody else.');
      return { take, claim };
    };

    it('is given once, however many ask', async () => {
      const take = await juno.makeTake();
      const { id } = await test.em().findOneOrFail(Measurement, { take: take.id });
      const claims = await Promise.all(Array.from({ length: 5 }, () => parts().claims.claim(id)));
      expect(claims.filter((claim) => claim !== null)).toHaveLength(1);
    });

    it('of an older attempt writes nothing', async () => {
      const { take, claim } = await claimed();
      await test.em().nativeUpdate(Measurement, { id: claim.measurementId }, { heartbeatAt: longAgo });
      await parts().sweep.run();
      const second = await parts().claims.claim(claim.measurementId);
      expect(second?.attempt).toBe(2);
      expect(await parts().claims.beat(claim, 'hits', 0.5)).toBe(false);
      await parts().claims.fail(claim, 'Too late.');
      expect(await parts().claims.finish(claim, await measuredTones())).toBe(false);
      expect(await reportsOf(take)).toBe(0);
      expect(await measurementOf(take)).toMatchObject({ state: 'running', attempt: 2, reason: null });
    });

    it('writes one report, however often it finishes', async () => {
      const { take, claim } = await claimed();
      const measured = await measuredTones();
      const finish = () => parts().claims.finish(claim, measured);
      expect((await Promise.all([finish(), finish(), finish()])).filter(Boolean)).toHaveLength(1);
      expect(await reportsOf(take)).toBe(1);
      const report = await test.em().findOneOrFail(Report, { take: take.id });
      expect((await juno.get(paths.take(take.id))).body).toMatchObject({ hasReport: true });
      expect(report.verdict).toBe(measured.facts.pairs[0].agreement.verdict);
    });

    it('fails after the third attempt that went silent', async () => {
      const { take, claim } = await claimed();
      const silence = { heartbeatAt: longAgo };
      for (let attempt = 1; attempt < 3; attempt++) {
        await test.em().nativeUpdate(Measurement, { id: claim.measurementId }, silence);
        await parts().sweep.run();
        await parts().claims.claim(claim.measurementId);
      }
      await test.em().nativeUpdate(Measurement, { id: claim.measurementId }, silence);
      await parts().sweep.run();
      expect(await measurementOf(take)).toMatchObject({ state: 'failed', attempt: 3 });
      expect((await measurementOf(take)).reason).toMatch(/broken off three times/);
    });

    it('waits for a store that is down as often as it takes', async () => {
      const { take, claim } = await claimed();
      for (let time = 0; time < 5; time++) {
        await parts().claims.waitForStore(claim);
        expect(await measurementOf(take)).toMatchObject({ state: 'queued', attempt: 0, reason: null });
        expect(await parts().claims.claim(claim.measurementId)).toMatchObject({ attempt: 1 });
      }
    });

    it('that beats is left alone by the sweep', async () => {
      const { take, claim } = await claimed();
      await test.em().nativeUpdate(Measurement, { id: claim.measurementId }, { heartbeatAt: longAgo });
      expect(await parts().claims.beat(claim, 'hits', 0.5)).toBe(true);
      await parts().sweep.run();
      expect(await measurementOf(take)).toMatchObject({
        state: 'running',
        stage: 'hits',
        progress: 0.5,
        attempt: 1,
      });
    });
  });
});
