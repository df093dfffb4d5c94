import { fork } from 'node:child_process';
import { once } from 'node:events';
import { mkdtemp, open, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { encodeFrames, wavHeader } from '@thudline/dsp';
import { measureFiles } from './measureFiles';
import { simpleTake } from './testing/takeFolder';

/**
 * Measures a one-minute and a one-hour pair, 24-bit at 96 kHz, each in a process of its own, and compares their peak
 * memory with the design's limits (2-measurements.md, "Speed and memory"): 300 MB, and no growth with length beyond 20 %.
 *
 * The hour needs 2.1 GB in the system's temporary folder. Run by `npm run check:memory`.
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
    const [peak] = (await once(child, 'message')) as [Peak];
    return peak;
  } finally {
    await rm(folder, { recursive: true, force: true });
  }
}

async function compare(): Promise<void> {
  const minute = await peakOf(1);
  const hour = await peakOf(60);
  for (const [name, peak] of [
    ['1 minute', minute],
    ['60 minutes', hour],
  ] as const) {
    console.log(`${name}: ${peak.memoryMb.toFixed(0)} MB at most, ${peak.wallS.toFixed(1)} s`);
  }
  const growth = hour.memoryMb / minute.memoryMb;
  const isWithin = hour.memoryMb < mostMb && growth < mostGrowth;
  console.log(
    `growth ${growth.toFixed(2)}; ${isWithin ? 'within' : 'beyond'} ${mostMb} MB and ${mostGrowth}`,
  );
  process.exitCode = isWithin ? 0 : 1;
}

const folder = process.argv[2];
void (folder ? measureOne(folder) : compare());
