import { createHash } from 'node:crypto';
import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { Readable } from 'node:stream';
import {
  DeleteObjectCommand,
  GetObjectCommand,
  HeadBucketCommand,
  ListObjectsV2Command,
  PutObjectCommand,
  S3Client,
} from '@aws-sdk/client-s3';
import { startObjectStore } from './objectStore';
import { type RunningService } from './runningService';

const bucket = 'takes-under-test';
const credentials = { accessKeyId: 'a-key', secretAccessKey: 'a-secret' };

let directory: string;
let store: RunningService | undefined;
let client: S3Client;

const clientFor = (endpoint: string, keys = credentials) =>
  new S3Client({
    endpoint,
    region: 'local',
    forcePathStyle: true,
    credentials: keys,
    requestChecksumCalculation: 'WHEN_REQUIRED',
    responseChecksumValidation: 'WHEN_REQUIRED',
  });

const start = (port: number) =>
  startObjectStore({
    directory,
    port,
    bucket,
    accessKey: credentials.accessKeyId,
    secretKey: credentials.secretAccessKey,
  });

beforeAll(async () => {
  process.env.AWS_SDK_JS_NODE_VERSION_SUPPORT_WARNING_DISABLED = 'true';
  directory = await mkdtemp(join(tmpdir(), 'thudline-objects-'));
  store = await start(0);
  client = clientFor(store.url);
});

afterAll(async () => {
  client?.destroy();
  await store?.stop();
  await rm(directory, { recursive: true, force: true });
});

/** Bytes without a pattern that a chunked encoding could hide in: a linear congruential sequence. */
function madeBytes(length: number): Buffer {
  const bytes = Buffer.alloc(length);
  let state = 12_345;
  for (let i = 0; i < length; i++) {
    state = (Math.imul(state, 1_664_525) + 1_013_904_223) >>> 0;
    bytes[i] = state >>> 24;
  }
  return bytes;
}

const sha256 = (bytes: Uint8Array) => createHash('sha256').update(bytes).digest('hex');

async function bytesOf(key: string, range?: string): Promise<Uint8Array> {
  const answer = await client.send(new GetObjectCommand({ Bucket: bucket, Key: key, Range: range }));
  return answer.Body!.transformToByteArray();
}

const statusOf = (call: Promise<unknown>): Promise<number | undefined> =>
  call.then(
    () => 200,
    (error: { $metadata?: { httpStatusCode?: number } }) => error.$metadata?.httpStatusCode,
  );

test('the bucket is there when the store is ready', async () => {
  expect(await statusOf(client.send(new HeadBucketCommand({ Bucket: bucket })))).toBe(200);
});

test('a streamed put comes back bit for bit', async () => {
  const sent = madeBytes(1_500_001);
  const body = Readable.from([sent.subarray(0, 700_000), sent.subarray(700_000)]);
  await client.send(
    new PutObjectCommand({ Bucket: bucket, Key: 'takes/a/b.wav', Body: body, ContentLength: sent.length }),
  );
  expect(sha256(await bytesOf('takes/a/b.wav'))).toBe(sha256(sent));
});

test('a range gives exactly the bytes asked for, and one past the end is refused', async () => {
  const sent = madeBytes(10_000);
  await client.send(new PutObjectCommand({ Bucket: bucket, Key: 'ranges.wav', Body: sent }));
  expect(Buffer.from(await bytesOf('ranges.wav', 'bytes=1234-2345'))).toEqual(sent.subarray(1234, 2346));
  expect(await statusOf(bytesOf('ranges.wav', 'bytes=10000-10010'))).toBe(416);
});

test('a deleted object is gone from the list and from reading', async () => {
  await client.send(new PutObjectCommand({ Bucket: bucket, Key: 'gone/x', Body: madeBytes(10) }));
  const list = () => client.send(new ListObjectsV2Command({ Bucket: bucket, Prefix: 'gone/' }));
  expect((await list()).Contents?.map((object) => object.Key)).toEqual(['gone/x']);
  await client.send(new DeleteObjectCommand({ Bucket: bucket, Key: 'gone/x' }));
  expect((await list()).Contents ?? []).toEqual([]);
  expect(await statusOf(bytesOf('gone/x'))).toBe(404);
});

test("the key s3rver ships with doesn't open it", async () => {
  const stranger = clientFor(store!.url, { accessKeyId: 'S3RVER', secretAccessKey: 'S3RVER' });
  expect(await statusOf(stranger.send(new GetObjectCommand({ Bucket: bucket, Key: 'ranges.wav' })))).toBe(
    403,
  );
  stranger.destroy();
});

test('objects outlive a restart, and the port is free again after a stop', async () => {
  const sent = madeBytes(4_000);
  await client.send(new PutObjectCommand({ Bucket: bucket, Key: 'kept', Body: sent }));
  const port = Number(new URL(store!.url).port);
  await store!.stop();
  store = await start(port);
  expect(Buffer.from(await bytesOf('kept'))).toEqual(sent);
});

test('a taken port is an error at once', async () => {
  const port = Number(new URL(store!.url).port);
  await expect(start(port)).rejects.toThrow(/EADDRINUSE/);
});
