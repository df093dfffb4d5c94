import { randomUUID } from 'node:crypto';
import { paths, TakeResponse } from '@thudline/contracts';
import { bytesSource, encodeWav, openWav } from '@thudline/dsp';
import { Test } from 'supertest';
import { ObjectStoreService } from '../src/storage/object-store.service';
import { joined, Person } from './support/person';
import { monoTracks, stereoTracks, tone, wav } from './support/recordings';
import { startTestApp, TestApp } from './support/test-app';

const sampleRateHz = 48_000;

describe('the sound of a take', () => {
  let test: TestApp;
  let juno: Person;
  let take: TakeResponse;
  let kick: Uint8Array;
  let overhead: Uint8Array;

  beforeAll(async () => {
    test = await startTestApp();
    juno = await joined(test);
    kick = wav([tone(60_000, 60)]);
    overhead = wav([tone(59_000, 75)]);
    const files = [
      { name: 'kick "1".wav', bytes: kick },
      { name: 'ドラム.wav', bytes: overhead },
    ];
    take = await juno.makeTake({ files, tracks: monoTracks });
  });
  afterAll(async () => test?.close());

  const bytesOf = (request: Test) =>
    request.buffer(true).parse((response, done) => {
      const parts: Buffer[] = [];
      response.on('data', (part: Buffer) => parts.push(part));
      response.on('end', () => done(null, Buffer.concat(parts)));
    });
  const trackOf = async (bytes: Uint8Array) => (await openWav(bytesSource(bytes))).track(0);
  const floatsOf = (body: Buffer) =>
    Array.from({ length: body.length / 4 }, (_, i) => body.readFloatLE(i * 4));

  describe('the originals', () => {
    it('come back bit for bit, as an attachment with the name they had, made safe', async () => {
      const [first, second] = take.files;
      const response = await bytesOf(juno.get(paths.takeFile(take.id, first.id))).expect(200);
      expect((response.body as Buffer).equals(kick)).toBe(true);
      expect(response.headers['content-disposition']).toBe('attachment; filename="kick 1.wav"');
      expect(response.headers['content-type']).toMatch(/^audio\/(x-)?wav/);
      expect(response.headers['x-content-type-options']).toBe('nosniff');
      const other = await bytesOf(juno.get(paths.takeFile(take.id, second.id))).expect(200);
      expect((other.body as Buffer).equals(overhead)).toBe(true);
      expect(other.headers['content-disposition']).toContain(
        "filename*=UTF-8''%E3%83%89%E3%83%A9%E3%83%A0.wav",
      );
    });

    it('tell their length and hash without the object store being asked', async () => {
      const stream = jest.spyOn(test.app.get(ObjectStoreService, { strict: false }), 'stream');
      const [file] = take.files;
      const response = await juno.agent.head(paths.takeFile(take.id, file.id)).expect(200);
      expect(response.headers).toMatchObject({
        'content-length': String(kick.length),
        etag: `"${file.sha256}"`,
      });
      expect(stream).not.toHaveBeenCalled();
      stream.mockRestore();
    });

    it('are not found under another take or another id', async () => {
      const other = await juno.makeTake();
      await juno.get(paths.takeFile(other.id, take.files[0].id)).expect(404);
      await juno.get(paths.takeFile(take.id, randomUUID())).expect(404);
      await juno.get(paths.takeFile(take.id, 'nonsense')).expect(404);
    });
  });

  describe('an excerpt', () => {
    const excerpt = (startS: number, durationS: number) =>
      bytesOf(juno.get(`${paths.excerpt(take.id)}?startS=${startS}&durationS=${durationS}`));

    it('holds exactly the samples of kick and overhead, one after the other', async () => {
      const response = await excerpt(0.25, 0.01).expect(200);
      expect(response.headers).toMatchObject({
        'x-sample-rate-hz': '48000',
        'x-start-frame': '12000',
        'x-frames': '480',
        'x-tracks': '2',
      });
      const read = async (bytes: Uint8Array) => Array.from(await (await trackOf(bytes)).read(12_000, 12_480));
      expect(floatsOf(response.body as Buffer)).toEqual([...(await read(kick)), ...(await read(overhead))]);
    });

    it('ends where the shorter track ends', async () => {
      const response = await excerpt(1.2, 1).expect(200);
      expect(response.headers).toMatchObject({ 'x-start-frame': '57600', 'x-frames': '1400' });
      expect((response.body as Buffer).length).toBe(1400 * 2 * 4);
      const beyond = await excerpt(100, 1).expect(200);
      expect(beyond.headers).toMatchObject({ 'x-start-frame': '59000', 'x-frames': '0' });
    });

    it('is read in blocks, so that many channels at a high rate do not fill the memory', async () => {
      const read = jest.spyOn(test.app.get(ObjectStoreService, { strict: false }), 'read');
      const response = await excerpt(0, 1.2).expect(200);
      const stretches = read.mock.calls.map(([, start, end]) => end - start);
      read.mockRestore();
      const channels = await Promise.all(
        [kick, overhead].map(async (file) => (await trackOf(file)).read(0, 57_600)),
      );
      expect(floatsOf(response.body as Buffer)).toEqual(channels.flatMap((samples) => [...samples]));
      // The header is read in windows of 64 KiB, the sound in blocks of 32,768 frames of 3 bytes.
      expect(Math.max(...stretches)).toBeLessThanOrEqual(32_768 * 3);
    });

    it('reads the right side of a stereo file for each track', async () => {
      const [left, right] = [tone(4_800, 75), tone(4_800, 60)];
      const files = [
        {
          name: 'both.wav',
          bytes: encodeWav({ channels: [left, right], sampleRateHz, bitDepth: 'float32' }),
        },
      ];
      const stereo = await juno.makeTake({ files, tracks: stereoTracks });
      const response = await bytesOf(juno.get(`${paths.excerpt(stereo.id)}?startS=0&durationS=0.1`)).expect(
        200,
      );
      expect(floatsOf(response.body as Buffer)).toEqual([...right, ...left]);
    });

    it.each([
      '',
      '?startS=-1&durationS=1',
      '?startS=0&durationS=0',
      '?startS=0&durationS=2.1',
      '?startS=x&durationS=1',
    ])('is refused for %p', async (query) => {
      const response = await juno.get(`${paths.excerpt(take.id)}${query}`).expect(400);
      expect(response.body).toMatchObject({ code: 'bad-request' });
    });
  });

  describe('listen.wav', () => {
    const listen = () => bytesOf(juno.get(paths.listen(take.id)));
    const expected = async () => {
      const channels = await Promise.all(
        [kick, overhead].map(async (file) => (await trackOf(file)).read(0, 59_000)),
      );
      return Buffer.from(encodeWav({ channels, sampleRateHz, bitDepth: 16 }));
    };

    it('is a 16-bit WAV with the kick left and the overhead right, as long as the shorter one', async () => {
      const response = await listen().expect(200);
      const whole = await expected();
      expect((response.body as Buffer).equals(whole)).toBe(true);
      expect(response.headers).toMatchObject({
        'content-length': String(whole.length),
        'accept-ranges': 'bytes',
        'cache-control': 'private, no-cache',
      });
      expect(response.headers['content-type']).toMatch(/^audio\/(x-)?wav/);
    });

    it('tells its length without being read', async () => {
      const response = await juno.agent.head(paths.listen(take.id)).expect(200);
      expect(response.headers['content-length']).toBe(String((await expected()).length));
    });

    it('gives a range as it lies in the whole', async () => {
      const whole = await expected();
      for (const [range, start, end] of [
        ['bytes=0-43', 0, 44],
        ['bytes=41-50', 41, 51],
        ['bytes=100001-', 100_001, whole.length],
        ['bytes=-7', whole.length - 7, whole.length],
      ] as const) {
        const response = await listen().set('Range', range).expect(206);
        expect((response.body as Buffer).equals(whole.subarray(start, end))).toBe(true);
        expect(response.headers['content-range']).toBe(`bytes ${start}-${end - 1}/${whole.length}`);
        expect(response.headers['content-length']).toBe(String(end - start));
      }
    });

    it('refuses a range that begins after the end, and tells the length', async () => {
      const { length } = await expected();
      const response = await juno.get(paths.listen(take.id)).set('Range', `bytes=${length}-`).expect(416);
      expect(response.headers['content-range']).toBe(`bytes */${length}`);
      expect(response.body).toMatchObject({ code: 'range-not-satisfiable' });
    });

    it('is not sent again to a browser that has it', async () => {
      const { etag } = (await listen()).headers as { etag: string };
      await juno.get(paths.listen(take.id)).set('If-None-Match', etag).expect(304);
      await listen().set('Range', 'bytes=0-9').set('If-Range', etag).expect(206);
      await listen().set('Range', 'bytes=0-9').set('If-Range', '"another"').expect(200);
    });
  });
});
