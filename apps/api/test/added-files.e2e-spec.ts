import { createHash, randomUUID } from 'node:crypto';
import {
  AddedFileResponse,
  addedFileLimits,
  addedFileResponse,
  listAddedFilesResponse,
  paths,
  TakeResponse,
} from '@thudline/contracts';
import { bytesSource, createLoudness, openWav } from '@thudline/dsp';
import { getScenario, takeFiles } from '@thudline/fixtures';
import { Test } from 'supertest';
import { AddedFile } from '../src/added-files/entities/added-file.entity';
import { Take } from '../src/takes/entities/take.entity';
import { Browser, joined, Person } from './support/person';
import { monoTracks } from './support/recordings';
import { openedBy, sharedBy } from './support/shares';
import { startTestApp, TestApp } from './support/test-app';
import { until } from './support/until';
import { startWorker, WorkerProcess } from './support/worker-process';

jest.setTimeout(120_000);

const flipped = { flipped: true, shiftMs: 1.6, gainDb: 5.7 };
const { kick, overhead } = takeFiles(getScenario('one-hit').name);
const files = [
  { name: 'kick.wav', bytes: kick },
  { name: 'overhead.wav', bytes: overhead },
];

const bytesOf = async (request: Test): Promise<Buffer> => {
  const response = await request.buffer(true).parse((answer, done) => {
    const parts: Buffer[] = [];
    answer.on('data', (part: Buffer) => parts.push(part));
    answer.on('end', () => done(null, Buffer.concat(parts)));
  });
  expect(response.status).toBe(200);
  return response.body as Buffer;
};

describe('one file of the two', () => {
  let test: TestApp;
  let juno: Person;
  let take: TakeResponse;
  let workers: WorkerProcess[] = [];

  beforeAll(async () => {
    test = await startTestApp();
    juno = await joined(test);
  });
  beforeEach(async () => {
    take = await juno.makeTake({ files, tracks: monoTracks, title: 'Front hole' });
  });
  afterEach(async () => {
    await Promise.all(workers.map((worker) => worker.stop('SIGKILL')));
    workers = [];
  });
  afterAll(async () => test?.close());

  const startOne = () => workers.push(startWorker(test));
  const make = async (choice: object = flipped) =>
    addedFileResponse.parse((await juno.post(paths.addedFiles(take.id), choice).expect(200)).body);
  const listed = async (browser: Pick<Browser, 'get'> = juno) =>
    listAddedFilesResponse.parse((await browser.get(paths.addedFiles(take.id)).expect(200)).body).items;
  const made = async (id: string): Promise<AddedFileResponse> =>
    until(async () => (await listed()).find((each) => each.id === id && each.state === 'done') ?? null);
  const addedKeys = async () => (await test.bucket.keys()).filter((key) => key.includes('/added/'));

  it('waits, is made by a worker, and comes back as a WAV that says how it was made', async () => {
    const asked = await make();
    expect(asked).toMatchObject({ state: 'queued', progress: 0, choice: flipped, file: null });
    await juno.get(paths.addedFileDownload(take.id, asked.id)).expect(404);
    startOne();
    const { file } = await made(asked.id);
    expect(file?.name).toBe(`take-${take.number}-added-flipped-1.6-ms-earlier-5.7-dB-louder.wav`);
    expect(file?.truePeakDbtp).toBeLessThanOrEqual(-1 + 1e-9);
    const bytes = await bytesOf(juno.get(paths.addedFileDownload(take.id, asked.id)));
    expect(bytes.length).toBe(file?.bytes);
    expect(createHash('sha256').update(bytes).digest('hex')).toBe(file?.sha256);
    const { facts } = await openWav(bytesSource(bytes));
    expect(facts).toMatchObject({
      encodingName: '24-bit PCM',
      channels: 1,
      durationS: take.files[0].durationS,
      broadcast: { originator: 'Thudline', date: take.recordedAt.slice(0, 10) },
    });
    expect(facts.broadcast?.description).toMatch(
      /^Kick and overhead added: overhead flipped, 1\.600 ms earlier, 5\.70 dB louder\./,
    );
    expect(bytes.subarray(0, 2000).toString('latin1')).toContain('Front hole\0');
  });

  it('is the same file when the same choice is asked for again, and another for another', async () => {
    const [once, again] = await Promise.all([make(), make({ ...flipped, shiftMs: 1.6000001 })]);
    expect(again.id).toBe(once.id);
    const other = await make({ flipped: false, shiftMs: -0.0001, gainDb: 0 });
    expect(other.choice).toEqual({ flipped: false, shiftMs: 0, gainDb: 0 });
    startOne();
    await made(once.id);
    await made(other.id);
    expect((await make()).file).toEqual((await made(once.id)).file);
    expect((await addedKeys()).filter((key) => key.startsWith(`takes/${take.id}/`))).toHaveLength(2);
  });

  it('is heard no louder than the two as recorded, from any place on', async () => {
    startOne();
    const [plain, loud] = [await make({ flipped: false, shiftMs: 0, gainDb: 0 }), await make()];
    const loudness = async ({ id }: AddedFileResponse) => {
      await made(id);
      const track = (
        await openWav(bytesSource(await bytesOf(juno.get(paths.addedFileListen(take.id, id)))))
      ).track(0);
      const meter = createLoudness({ sampleRateHz: track.sampleRateHz });
      meter.push(await track.read(0, track.frames));
      return meter.result().integratedLufs ?? NaN;
    };
    // 16 bits against 24, and the file as recorded may be turned down itself.
    expect((await loudness(loud)) - (await loudness(plain))).toBeLessThan(0.1);
    const part = await juno.get(paths.addedFileListen(take.id, loud.id)).set('Range', 'bytes=44-143');
    expect([part.status, part.headers['content-length']]).toEqual([206, '100']);
  });

  it('is taken up again where a worker died over it', async () => {
    const { id } = await make();
    const died = { state: 'running' as const, attempt: 1, heartbeatAt: new Date(Date.now() - 60_000) };
    await test.em().nativeUpdate(AddedFile, { id }, died);
    startOne();
    await made(id);
    expect(await test.em().findOneOrFail(AddedFile, { id })).toMatchObject({ attempt: 2 });
  });

  it('is given up after three broken attempts, and tried again when asked for', async () => {
    const { id } = await make();
    const worn = { state: 'running' as const, attempt: 3, heartbeatAt: new Date(Date.now() - 60_000) };
    await test.em().nativeUpdate(AddedFile, { id }, worn);
    startOne();
    const failed = await until(async () => (await listed()).find(({ state }) => state === 'failed') ?? null);
    expect(failed.reason).toMatch(/^Making this file was broken off three times\./);
    expect(await make()).toMatchObject({ id, reason: null });
    await made(id);
  });

  it('is gone with its object once it is removed', async () => {
    startOne();
    const { id } = await make();
    await made(id);
    await juno.delete(paths.addedFile(take.id, id)).expect(204);
    expect(await listed()).toEqual([]);
    expect((await addedKeys()).filter((key) => key.includes(id))).toEqual([]);
    await juno.get(paths.addedFileDownload(take.id, id)).expect(404);
    await juno.delete(paths.addedFile(take.id, id)).expect(404);
  });

  it('goes with its take', async () => {
    const { id } = await make();
    await test.em().nativeDelete(Take, { id: take.id });
    expect(await test.em().count(AddedFile, { id })).toBe(0);
  });

  it.each([
    [{ ...flipped, shiftMs: 20.1 }, 'A shift is at most 20 ms either way.'],
    [{ ...flipped, gainDb: -41 }, 'The overhead can be at most 40 dB quieter.'],
    [{ ...flipped, gainDb: 61 }, 'The overhead can be at most 60 dB louder.'],
    [{ ...flipped, gainDb: '5' }, ''],
    [{ ...flipped, flipped: undefined }, ''],
    [{ ...flipped, also: 1 }, ''],
  ])('refuses %j', async (choice, sentence) => {
    const response = await juno.post(paths.addedFiles(take.id), choice).expect(400);
    expect((response.body as { message: string }).message).toContain(sentence);
    expect(await listed()).toEqual([]);
  });

  it('refuses more than a take keeps', async () => {
    for (let i = 0; i < addedFileLimits.mostOfTake; i++) await make({ ...flipped, shiftMs: i });
    const response = await juno.post(paths.addedFiles(take.id), { ...flipped, shiftMs: 19 }).expect(409);
    expect(response.body).toMatchObject({
      message: 'A take keeps up to 12 added files; remove one to make another.',
    });
    await make({ ...flipped, shiftMs: 3 });
  });

  describe('for others', () => {
    let id: string;
    beforeEach(async () => {
      id = (await make()).id;
      startOne();
      await made(id);
    });
    const guestWith = async (permissions: object) => {
      const guest = new Browser(test);
      await openedBy(guest, await sharedBy(juno, take, permissions));
      return guest;
    };
    const answers = async (browser: Browser) => ({
      list: (await browser.get(paths.addedFiles(take.id))).status,
      make: (await browser.post(paths.addedFiles(take.id), { ...flipped, gainDb: 1 })).status,
      file: (await browser.get(paths.addedFileDownload(take.id, id))).status,
      listen: (await browser.get(paths.addedFileListen(take.id, id))).status,
      remove: (await browser.delete(paths.addedFile(take.id, id))).status,
    });

    it('may be downloaded and heard by a guest who may do that, and never made or removed', async () => {
      const shut = { make: 403, remove: 403 };
      expect(await answers(await guestWith({ canDownload: true }))).toEqual({
        ...{ list: 200, file: 200, listen: 200 },
        ...shut,
      });
      expect(await answers(await guestWith({ canDownload: false }))).toEqual({
        ...{ list: 403, file: 403, listen: 200 },
        ...shut,
      });
    });

    it('is as if there were none for another player and for another take, and asks who is there first', async () => {
      const nothing = { list: 404, make: 404, file: 404, listen: 404, remove: 404 };
      expect(await answers(await joined(test, 'Oda'))).toEqual(nothing);
      expect(await answers(new Browser(test))).toEqual({
        list: 401,
        make: 401,
        file: 401,
        listen: 401,
        remove: 401,
      });
      const other = await juno.makeTake();
      await juno.get(paths.addedFileDownload(other.id, id)).expect(404);
      await juno.get(paths.addedFileDownload(take.id, randomUUID())).expect(404);
      await juno.get(paths.addedFileDownload(take.id, 'nonsense')).expect(404);
      expect(await listed()).toHaveLength(1);
    });
  });
});
