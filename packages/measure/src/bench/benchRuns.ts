import { execFile, fork } from 'node:child_process';
import { once } from 'node:events';
import { promisify } from 'node:util';
import { measureCommand } from '../cli/measureCommand';
import { pairPaths } from './benchTake';

/** What one run of one program took, the start of its process included. */
export interface Run {
  readonly wallS: number;
  /** User and system time of all its threads. */
  readonly cpuS: number;
  readonly memoryMb: number;
}

const child = require.resolve('../benchChild');
const mostOutput = 64 * 1024 * 1024;

/** Measures the pair in a process of its own, as `npm run measure -- kick.wav overhead.wav --json` does. */
export async function ownRun(folder: string): Promise<Run> {
  const started = performance.now();
  const process = fork(child, pairPaths(folder));
  const ended = once(process, 'exit') as Promise<[number]>;
  const told = once(process, 'message') as Promise<[Omit<Run, 'wallS'>]>;
  const [exitCode] = await ended;
  const wallS = (performance.now() - started) / 1000;
  if (exitCode !== 0) throw new Error('The measurement ended without a figure.');
  const [figures] = await told;
  return { ...figures, wallS };
}

/** The other end of {@link ownRun}. */
export async function measureAndTell(paths: readonly string[]): Promise<void> {
  const { exitCode, stderr } = await measureCommand([...paths, '--json']);
  if (exitCode !== 0) throw new Error(stderr);
  const { userCPUTime, systemCPUTime, maxRSS } = process.resourceUsage();
  const run = { cpuS: (userCPUTime + systemCPUTime) / 1e6, memoryMb: maxRSS / 1024 };
  await new Promise<void>((done) => {
    process.send?.(run, () => done());
  });
}

/** ffmpeg's loudness and true peak of the two files, one after the other. */
export async function ffmpegRun(folder: string): Promise<Run> {
  const runs: Run[] = [];
  for (const path of pairPaths(folder)) runs.push(await ffmpegFile(path));
  return {
    wallS: runs.reduce((sum, { wallS }) => sum + wallS, 0),
    cpuS: runs.reduce((sum, { cpuS }) => sum + cpuS, 0),
    memoryMb: Math.max(...runs.map(({ memoryMb }) => memoryMb)),
  };
}

async function ffmpegFile(path: string): Promise<Run> {
  // A line of its log every 100 ms would only slow it down.
  const filter = 'ebur128=peak=true:framelog=verbose';
  const words = ['-hide_banner', '-nostats', '-benchmark', '-i', path, '-af', filter, '-f', 'null', '-'];
  const started = performance.now();
  const { stderr } = await promisify(execFile)('ffmpeg', words, { maxBuffer: mostOutput });
  const wallS = (performance.now() - started) / 1000;
  const figure = (name: string): number => Number(new RegExp(`${name}=([\\d.]+)`).exec(stderr)?.[1]);
  return { wallS, cpuS: figure('utime') + figure('stime'), memoryMb: figure('maxrss') / 1024 };
}
