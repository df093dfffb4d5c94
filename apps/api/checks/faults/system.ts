import { execFileSync } from 'node:child_process';
import { mkdirSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';
import { Line, openLine } from '../lib/line';
import { createMailServer, MailServer } from '../lib/mailServer';
import { freePort } from '../lib/ports';
import { makePostgres, PostgresServer } from '../lib/postgres';
import { createProgram, Program } from '../lib/program';
import { waitUntil } from '../lib/waiting';

const apps = resolve(__dirname, '../../../..');
const storeMiB = 2_048;
/** A home's line: slow enough that faults come while files are on their way. */
const bytesPerSecond = 4_000_000;
/** Chosen by how long a machine with two busy cores takes; common practice, no source. */
const recoversWithinMs = 60_000;

export interface System {
  url: string;
  folder: string;
  database: PostgresServer;
  store: Program;
  /** Whether the object store has a disk of its own, which can be filled. */
  storeDir: string;
  hasOwnDisk: boolean;
  api: Program;
  worker: Program;
  line: Line;
  mail: MailServer;
  /** @returns milliseconds until every part answered */
  recovered(): Promise<number>;
  /** Runs a program of the API to its end, and gives what it printed. */
  run(script: string, ...args: string[]): string;
  stop(): Promise<void>;
}

/** The whole product on loopback, every part a process of its own. */
export async function startSystem(): Promise<System> {
  const folder = mkdtempSync(join(tmpdir(), 'thudline-faults-'));
  const [postgresPort, s3Port, smtpPort, apiPort, linePort] = [
    await freePort(),
    await freePort(),
    await freePort(),
    await freePort(),
    await freePort(),
  ] as const;
  const logPath = (name: string) => join(folder, `${name}.log`);
  const storeDir = join(folder, 'objects');
  mkdirSync(storeDir);
  const hasOwnDisk = mountDisk(storeDir);
  const database = makePostgres(postgresPort, logPath('postgres'));
  await database.start();
  const url = `http://127.0.0.1:${linePort}`;
  const keys = { S3_ACCESS_KEY: 'check', S3_SECRET_KEY: 'check-check-check', S3_BUCKET: 'thudline' };
  const store = createProgram({
    command: [process.execPath, join(apps, 'local-services/dist/main.js')],
    env: {
      ...process.env,
      ...keys,
      OBJECT_STORE_DIR: storeDir,
      S3_PORT: String(s3Port),
      MAIL_DIR: join(folder, 'mail'),
      SMTP_PORT: String(await freePort()),
      MAIL_PAGE_PORT: String(await freePort()),
    },
    logPath: logPath('store'),
  });
  store.start();
  const env: NodeJS.ProcessEnv = {
    ...process.env,
    ...keys,
    NODE_ENV: 'production',
    DATABASE_URL: database.url,
    S3_ENDPOINT: `http://127.0.0.1:${s3Port}`,
    S3_REGION: 'local',
    S3_FORCE_PATH_STYLE: 'true',
    S3_CHECKSUMS: 'when-required',
    AWS_SDK_JS_NODE_VERSION_SUPPORT_WARNING_DISABLED: 'true',
    SMTP_URL: `smtp://127.0.0.1:${smtpPort}`,
    JWT_SECRET: 'for this check only, and long enough for it',
    PUBLIC_URL: url,
    HOST: '127.0.0.1',
    PORT: String(apiPort),
    SCRATCH_DIR: join(folder, 'scratch'),
    MEASURE_THREADS: '1',
    HEARTBEAT_MS: '500',
    SILENT_AFTER_MS: '4000',
    MAIL_LIMIT_PER_ACCOUNT: '100000',
    MAIL_LIMIT_PER_ADDRESS: '100000',
    LOG_LEVEL: 'info',
  };
  const script = (path: string) => join(apps, 'api/dist', path);
  const run = (path: string, ...args: string[]) =>
    execFileSync(process.execPath, [script(path), ...args], { env, encoding: 'utf8' });
  run('database/migrate.js');
  const program = (name: string, path: string) =>
    createProgram({ command: [process.execPath, script(path)], env, logPath: logPath(name) });
  const [api, worker] = [program('api', 'main.js'), program('worker', 'worker-main.js')];
  api.start();
  worker.start();
  const line = await openLine({ port: linePort, toPort: apiPort, bytesPerSecond });
  const mail = createMailServer(smtpPort);
  await mail.open();
  const recovered = () =>
    waitUntil(
      'the system answers',
      async () => (await fetch(`http://127.0.0.1:${apiPort}/api/health`)).ok,
      recoversWithinMs,
    );
  await recovered();
  return {
    url,
    folder,
    database,
    store,
    storeDir,
    hasOwnDisk,
    api,
    worker,
    line,
    mail,
    recovered,
    run,
    async stop() {
      for (const part of [worker, api, store]) await part.stop('SIGTERM');
      await line.close();
      await mail.close();
      await database.program.stop('SIGINT');
      database.remove();
      if (hasOwnDisk) execFileSync('umount', [storeDir]);
      rmSync(folder, { recursive: true, force: true });
    },
  };
}

/** A small disk in memory; only root may make one. */
function mountDisk(folder: string): boolean {
  if (process.getuid?.() !== 0) return false;
  try {
    execFileSync('mount', ['-t', 'tmpfs', '-o', `size=${storeMiB}m`, 'thudline-faults', folder], {
      stdio: 'ignore',
    });
    return true;
  } catch {
    return false;
  }
}
