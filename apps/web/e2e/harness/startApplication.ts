import { spawn, type ChildProcess } from 'node:child_process';
import { existsSync, mkdirSync, openSync } from 'node:fs';
import { join, resolve } from 'node:path';
import { getDemoTake, starTitle } from './apiSession';
import { browserSettings } from './browserSettings';
import { keepPlayerState } from './playerState';

const root = resolve(import.meta.dirname, '../../../..');
const webDist = join(root, 'apps/web/dist');
const startedWithinMs = 60_000;
const pauseMs = 150;

/** Who is signed in stays so for a quarter of an hour without a page that refreshes it. */
const signedInMs = 8 * 60_000;

const children: ChildProcess[] = [];
let signingIn: NodeJS.Timeout | undefined;

/** Playwright's global setup: the built application on a fresh database, with the demo in it; gives back its end. */
export default async function startApplication(): Promise<() => Promise<void>> {
  const { publicUrl } = browserSettings();
  if (!existsSync(join(webDist, 'index.html')))
    throw new Error('The web application is not built: npm run build.');
  try {
    await finished('migrate', 'apps/api/dist/database/migrate.js');
    start('worker', 'apps/api/dist/worker-main.js');
    const api = start('api', 'apps/api/dist/main.js');
    await healthy(`${publicUrl}/api/health`, api);
    await finished('seed', 'fixtures/dist/seedDemo.js');
    await keepPlayerState();
    signingIn = setInterval(() => void keepPlayerState(), signedInMs);
    await finished('sample', 'apps/api/dist/sample-take.js', (await getDemoTake(starTitle)).id);
  } catch (error) {
    await stopAll();
    throw error;
  }
  return stopAll;
}

/** `setpriv` lets the kernel end the child when Playwright itself is killed. */
function start(name: string, script: string, ...args: string[]): ChildProcess {
  const { databaseUrl, apiPort, publicUrl, resultsDir } = browserSettings();
  mkdirSync(resultsDir, { recursive: true });
  const log = openSync(join(resultsDir, `${name}.log`), 'w');
  const child = spawn(
    'setpriv',
    ['--pdeathsig', 'TERM', '--', process.execPath, join(root, script), ...args],
    {
      stdio: ['ignore', log, log],
      env: {
        ...process.env,
        NODE_ENV: 'production',
        DATABASE_URL: databaseUrl,
        HOST: '127.0.0.1',
        PORT: apiPort,
        PUBLIC_URL: publicUrl,
        API_URL: publicUrl,
        WEB_DIST: webDist,
        // The least argon2 takes: these passwords guard nothing, and every sign-in waits for it.
        ARGON2_MEMORY_KIB: '1024',
        ARGON2_TIME: '1',
      },
    },
  );
  children.push(child);
  return child;
}

async function finished(name: string, script: string, ...args: string[]): Promise<void> {
  const child = start(name, script, ...args);
  const code = await new Promise<number | null>((resolve) => child.once('exit', resolve));
  if (code !== 0) throw new Error(`${script} ended with ${code}; see ${logOf(name)}.`);
}

async function healthy(url: string, api: ChildProcess): Promise<void> {
  const deadlineMs = Date.now() + startedWithinMs;
  while (Date.now() < deadlineMs && isRunning(api)) {
    const answer = await fetch(url).catch(() => null);
    if (answer?.ok) return;
    await new Promise((resolve) => setTimeout(resolve, pauseMs));
  }
  throw new Error(`The API did not come up; see ${logOf('api')}.`);
}

const logOf = (name: string) => join(browserSettings().resultsDir, `${name}.log`);
const isRunning = (child: ChildProcess) => child.exitCode === null && child.signalCode === null;

async function stopAll(): Promise<void> {
  clearInterval(signingIn);
  await Promise.all(children.filter(isRunning).map(stop));
}

function stop(child: ChildProcess): Promise<void> {
  return new Promise((resolve) => {
    child.once('exit', () => resolve());
    child.kill('SIGTERM');
  });
}
