import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { encodeWav } from '@thudline/dsp';

/** A folder for one spec's files, gone after it. */
export interface TakeFolder {
  readonly path: string;
  /** @returns the path of a 24-bit WAV with these channels */
  wav(name: string, channels: readonly Float32Array[], sampleRateHz?: number): Promise<string>;
  /** @returns the path of a file with these bytes */
  bytes(name: string, bytes: Uint8Array): Promise<string>;
  remove(): Promise<void>;
}

/** Makes an empty folder in the system's own place for such. */
export async function takeFolder(): Promise<TakeFolder> {
  const path = await mkdtemp(join(tmpdir(), 'thudline-measure-'));
  const bytes = async (name: string, content: Uint8Array) => {
    await writeFile(join(path, name), content);
    return join(path, name);
  };
  return {
    path,
    bytes,
    wav: (name, channels, sampleRateHz = 48000) =>
      bytes(name, encodeWav({ channels, sampleRateHz, bitDepth: 24 })),
    remove: () => rm(path, { recursive: true, force: true }),
  };
}

/**
 * A take as a formula: decaying 60 Hz kicks, which the overhead hears later and the other way up.
 *
 * @param options.seconds - one kick every half second, the first at 1 s
 */
export function simpleTake(options: {
  seconds: number;
  sampleRateHz?: number;
  arrivalMs?: number;
  overheadGain?: number;
}) {
  const { seconds, sampleRateHz = 48000, arrivalMs = 2, overheadGain = -0.5 } = options;
  const kick = new Float32Array(seconds * sampleRateHz);
  const overhead = new Float32Array(seconds * sampleRateHz);
  const delay = Math.round((arrivalMs / 1000) * sampleRateHz);
  for (let at = sampleRateHz; at < kick.length - sampleRateHz / 2; at += sampleRateHz / 2) {
    for (let i = 0; i < 0.3 * sampleRateHz; i++) {
      const s = i / sampleRateHz;
      const body = Math.sin(2 * Math.PI * 60 * s) * Math.exp(-s / 0.08);
      const click = Math.sin(2 * Math.PI * 900 * s) * Math.exp(-s / 0.004);
      const wave = 0.35 * body + 0.1 * click;
      add(kick, at + i, wave);
      add(overhead, at + i + delay, overheadGain * wave);
    }
  }
  return { kick, overhead };
}

function add(samples: Float32Array, at: number, value: number): void {
  samples[at] = (samples[at] ?? 0) + value;
}
