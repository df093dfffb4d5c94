import { ChildProcess, spawn } from 'node:child_process';
import { once } from 'node:events';
import { resolve } from 'node:path';
import { TestApp } from './test-app';
import { testEnvironment } from './test-config';

export interface WorkerProcess {
  /** @returns how it ended */
  stop(signal: 'SIGTERM' | 'SIGKILL'): Promise<{ code: number | null; signal: string | null }>;
}

/** A worker of its own process, as in production but with a faster pulse, on the database of `test`. It runs `dist`. */
export function startWorker(test: TestApp, changed: NodeJS.ProcessEnv = {}): WorkerProcess {
  const env = testEnvironment(test.database.url, {
    S3_BUCKET: test.bucket.name,
    SCRATCH_DIR: test.config.scratchDir,
    MEASURE_THREADS: '1',
    HEARTBEAT_MS: '200',
    SILENT_AFTER_MS: '1500',
    ...changed,
  });
  const main = resolve(__dirname, '../../dist/worker-main.js');
  const child = spawn(process.execPath, [main], { env, stdio: ['ignore', 'inherit', 'inherit'] });
  return { stop: (signal) => stopped(child, signal) };
}

async function stopped(child: ChildProcess, signal: 'SIGTERM' | 'SIGKILL') {
  if (child.exitCode === null && child.signalCode === null) {
    const exit = once(child, 'exit');
    child.kill(signal);
    await exit;
  }
  return { code: child.exitCode, signal: child.signalCode };
}
