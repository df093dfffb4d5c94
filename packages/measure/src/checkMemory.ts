import { fork } from 'node:child_process';
import { once } from 'node:events';
import { mkdtemp, open, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { encodeFrames, wavHeader } from '@thudline/dsp';
import { measureFiles } from './measureFiles';
import { simpleTake } from './testing/takeFolder';

/**
 * Measures pairs of one, ten and sixty minutes, 24-bit at 96 kHz, each in a process of its own, and prints their peak
 * memory and time. Run by `npm run check:memory`; the hour needs 2.1 GB in the system's temporary folder.
 *
 * Limits: 300 MB, and no growth beyond 20 % (2-measurements.md, "Speed and memory"). Growth is judged from ten minutes to
 * sixty: in the first minutes V8 widens its heap for young objects to its full size, whatever the length.
 */
const sampleRateHz = 96_000;
const bitDepth = 24;
const loopS = 10;
const mostMb = 300;
const mostGrowth = 1.2;

interface Peak {
  readonly memoryMb: number;
  readonly wallS: number;
}

async function writeLong(path: string, loop: Float32Array, minutes: number): Promise<void> {
  const repeats = (minutes * 60) / loopS;
  const handle = await open(path, 'w');
  await handle.write(wavHeader({ channels: 1, sampleRateHz, bitDepth, frames: loop.length * repeats }));
  const bytes = encodeFrames([loop], bitDepth);
  for (let i = 0; i < repeats; i++) await handle.write(bytes);
  await handle.close();
}

async function measureOne(folder: string): Promise<void> {
  const started = process.hrtime.bigint();
  await measureFiles({
    files: [{ path: join(folder, 'kick.wav') }, { path: join(folder, 'overhead.wav') }],
    tracks: [
      { role: 'kick', fileIndex: 0, channel: 0 },
      { role: 'overhead', fileIndex: 1, channel: 0 },
    ],
  });
  const peak: Peak = {
    memoryMb: process.resourceUsage().maxRSS / 1024,
    wallS: Number(process.hrtime.bigint() - started) / 1e9,
  };
  process.send?.(peak);
}

async function peakOf(minutes: number): Promise<Peak> {
  const folder = await mkdtemp(join(tmpdir(), 'thudline-memory-'));
  try {
    const { kick, overhead } = simpleTake({ seconds: loopS, sampleRateHz });
    await writeLong(join(folder, 'kick.wav'), kick, minutes);
    await writeLong(join(folder, 'overhead.wav'), overhead, minutes);
    const child = fork(__filename, [folder]);
    const ended = once(child, 'exit').then(() => {
      throw new Error('The measurement ended without a figure.');
    });
    const [peak] = (await Promise.race([once(child, 'message'), ended])) as [Peak];
    return peak;
  } finally {
    await rm(folder, { recursive: true, force: true });
  }
}

async function compare(): Promise<void> {
  const peaks = new Map<number, Peak>();
  for (const minutes of [1, 10, 60]) {
    const peak = await peakOf(minutes);
    peaks.set(minutes, peak);
    console.log(
      `${minutes} min: ${peak.memoryMb.toFixed(0)} MB at most, measured in ${peak.wallS.toFixed(1)} s`,
    );
  }
  const largest = Math.max(...[...peaks.values()].map(({ memoryMb }) => memoryMb));
  const growth = (peaks.get(60)?.memoryMb ?? Infinity) / (peaks.get(10)?.memoryMb ?? 0);
  const isWithin = largest < mostMb && growth < mostGrowth;
  console.log(
    `growth ${growth.toFixed(2)}: ${isWithin ? 'within' : 'beyond'} ${mostMb} MB and ${mostGrowth}`,
  );
  process.exitCode = isWithin ? 0 : 1;
}

const folder = process.argv[2];
void (folder ? measureOne(folder) : compare());
