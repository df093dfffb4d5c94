import { ChildProcess, spawn } from 'node:child_process';
import { once } from 'node:events';
import { closeSync, openSync } from 'node:fs';

interface ProgramOptions {
  command: string[];
  env: NodeJS.ProcessEnv;
  logPath: string;
  cwd?: string;
  /** Options of setpriv, such as another user; it drops the tie to this process when a second program changes the user. */
  as?: string[];
}

const restartAfterMs = 500;

export interface Program {
  start(): void;
  /** Ends it with a signal and waits for its end. */
  stop(signal: NodeJS.Signals): Promise<void>;
  /** How often it ended though nobody stopped it. */
  readonly ownEnds: number;
}

/** A process that can be ended and started again; the kernel ends it with this one. One that ends by itself is started again. */
export function createProgram({ command, env, logPath, cwd, as = [] }: ProgramOptions): Program {
  let child: ChildProcess | undefined;
  let isStopping = false;
  let ownEnds = 0;
  const start = () => {
    isStopping = false;
    const log = openSync(logPath, 'a');
    const started = spawn('setpriv', ['--pdeathsig', 'KILL', ...as, '--', ...command], {
      env,
      cwd,
      stdio: ['ignore', log, log],
    });
    closeSync(log);
    started.once('exit', () => {
      if (isStopping || child !== started) return;
      // As whatever looks after processes in production would.
      ownEnds += 1;
      setTimeout(() => isStopping || start(), restartAfterMs);
    });
    child = started;
  };
  return {
    start,
    async stop(signal) {
      isStopping = true;
      if (!child || child.exitCode !== null || child.signalCode !== null) return;
      const ended = once(child, 'exit');
      child.kill(signal);
      await ended;
    },
    get ownEnds() {
      return ownEnds;
    },
  };
}
