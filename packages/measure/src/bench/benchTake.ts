import { execFile } from 'node:child_process';
import { open } from 'node:fs/promises';
import { join } from 'node:path';
import { promisify } from 'node:util';
import { encodeFrames, wavHeader } from '@thudline/dsp';
import { withOpenFiles } from '../openFiles';

const writeTakes = join(__dirname, '../../../../fixtures/dist/writeTakes.js');
/** A groove of the synthetic kit, 16.4 s of 24 bits at 48 kHz. */
const scenario = 'good';
const sides = ['kick', 'overhead'] as const;
const bitDepth = 24;

/** One groove of the fixtures, of which takes of any length are made. */
export interface Groove {
  readonly kick: Float32Array;
  readonly overhead: Float32Array;
  readonly sampleRateHz: number;
}

export interface BenchTake {
  readonly minutes: number;
  /** The groove's own rate or a multiple of it. */
  readonly sampleRateHz: number;
}

/** @returns the two files of a pair made by {@link writeBenchTake} */
export function pairPaths(folder: string): string[] {
  return sides.map((side) => join(folder, `${side}.wav`));
}

/** Synthesises the groove; `folder` takes its two files. */
export async function makeGroove(folder: string): Promise<Groove> {
  await promisify(execFile)(process.execPath, [writeTakes, folder, scenario]);
  return withOpenFiles(pairPaths(join(folder, scenario)), async (files) => {
    const [kick, overhead] = files.map(({ wav }) => wav.track(0));
    if (!kick || !overhead) throw new Error('A pair has two files.');
    return {
      sampleRateHz: kick.sampleRateHz,
      kick: await kick.read(0, kick.frames),
      overhead: await overhead.read(0, overhead.frames),
    };
  });
}

/**
 * Writes a pair of 24-bit files: the groove over and over, each time 0 to 6 dB softer, so that the loudest places come as
 * seldom as in a played take.
 */
export async function writeBenchTake(folder: string, groove: Groove, take: BenchTake): Promise<void> {
  const frames = Math.round(take.minutes * 60 * take.sampleRateHz);
  for (const side of sides) {
    const loop = raised(groove[side], Math.round(take.sampleRateHz / groove.sampleRateHz));
    const handle = await open(join(folder, `${side}.wav`), 'w');
    await handle.write(wavHeader({ channels: 1, sampleRateHz: take.sampleRateHz, bitDepth, frames }));
    for (let written = 0, repeat = 0; written < frames; written += loop.length, repeat += 1) {
      const gain = 10 ** (-softerDb(repeat) / 20);
      const samples = loop.subarray(0, frames - written).map((sample) => gain * sample);
      await handle.write(encodeFrames([samples], bitDepth));
    }
    await handle.close();
  }
}

/** The same for both microphones; spread over 0–6 dB by the golden ratio, so that no length has a pattern. */
function softerDb(repeat: number): number {
  return 6 * ((repeat * 0.618034) % 1);
}

/** At a multiple of its rate, with straight lines between the samples: enough for a measurement of time. */
function raised(samples: Float32Array, times: number): Float32Array {
  return Float32Array.from({ length: samples.length * times }, (_unused, i) => {
    const at = Math.floor(i / times);
    const here = samples[at] ?? 0;
    return here + (((samples[at + 1] ?? here) - here) * (i % times)) / times;
  });
}
