import { execFile } from 'node:child_process';
import { mkdtemp, readFile, rm, stat } from 'node:fs/promises';
import { createServer, type AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';
import { promisify } from 'node:util';

const program = resolve(__dirname, '../bin/settings.mjs');

let folder: string;
let file: string;

beforeEach(async () => {
  folder = await mkdtemp(join(tmpdir(), 'thudline-settings-'));
  file = join(folder, 'kept', 'settings.json');
});
afterEach(() => rm(folder, { recursive: true, force: true }));

async function settings(...options: string[]): Promise<Record<string, string>> {
  const { stdout } = await promisify(execFile)(process.execPath, [program, file, ...options]);
  return Object.fromEntries(
    stdout
      .trim()
      .split('\n')
      .map((line) => line.split('=') as [string, string]),
  );
}

/** Keeps a port busy while `use` runs. */
async function withTakenPort<T>(port: number, use: () => Promise<T>): Promise<T> {
  const server = createServer();
  await new Promise<void>((ready) => server.listen(port, '127.0.0.1', ready));
  try {
    return await use();
  } finally {
    await new Promise((closed) => server.close(closed));
  }
}

async function freePort(): Promise<number> {
  const server = createServer();
  await new Promise<void>((ready) => server.listen(0, '127.0.0.1', ready));
  const { port } = server.address() as AddressInfo;
  await new Promise((closed) => server.close(closed));
  return port;
}

const everything = [
  '--port',
  'A_PORT=0',
  '--port',
  'B_PORT=0',
  '--secret',
  'A_SECRET',
  '--password',
  'A_WORD',
];

test('what was made once is there again the next time', async () => {
  const first = await settings(...everything);
  expect(await settings(...everything)).toEqual(first);
});

test('secrets are long, differ, and lie in a file that only its owner can read', async () => {
  const { A_SECRET, B_SECRET } = await settings('--secret', 'A_SECRET', '--secret', 'B_SECRET');
  expect(A_SECRET).toMatch(/^[0-9a-f]{64}$/);
  expect(B_SECRET).not.toBe(A_SECRET);
  expect((await stat(file)).mode & 0o777).toBe(0o600);
  expect((await stat(join(folder, 'kept'))).mode & 0o777).toBe(0o700);
});

test('a password can be typed and is long enough to join with', async () => {
  const { A_WORD } = await settings('--password', 'A_WORD');
  expect(A_WORD).toMatch(/^[a-z]+-[a-z]+-\d{4}$/);
  expect(A_WORD.length).toBeGreaterThanOrEqual(10);
});

test('two names never get the same port', async () => {
  const port = await freePort();
  const { A_PORT, B_PORT } = await settings('--port', `A_PORT=${port}`, '--port', `B_PORT=${port}`);
  expect(A_PORT).toBe(String(port));
  expect(B_PORT).not.toBe(A_PORT);
});

test('a kept port that is taken is replaced for that run only', async () => {
  const { A_PORT } = await settings('--port', 'A_PORT=0');
  const meanwhile = await withTakenPort(Number(A_PORT), () => settings('--port', 'A_PORT=0'));
  expect(meanwhile.A_PORT).not.toBe(A_PORT);
  expect((await settings('--port', 'A_PORT=0')).A_PORT).toBe(A_PORT);
});

test('asking for something new keeps what was there', async () => {
  const before = await settings('--secret', 'A_SECRET');
  await settings('--secret', 'B_SECRET');
  expect(JSON.parse(await readFile(file, 'utf8'))).toMatchObject(before);
});
