import { execFile } from 'node:child_process';
import { promisify } from 'node:util';
import type { WavFacts } from '@thudline/dsp';
import type { Reader } from './sampleComparison';

const execute = promisify(execFile);
const longestMs = 60_000;

/**
 * Has another program write all samples of a WAV file, interleaved float64, into a file.
 *
 * @returns whether it could
 * @throws where the program isn't here
 */
export async function writeSamples(
  reader: Reader,
  wav: { path: string; facts: WavFacts },
  rawPath: string,
): Promise<boolean> {
  const [command, ...words] = commandLine(reader, wav, rawPath);
  try {
    await execute(command, words, { timeout: longestMs });
    return true;
  } catch (error) {
    const { code } = error as { code?: unknown };
    if (typeof code === 'number') return false;
    throw new Error(`${command} can't be run; install it with "apt-get install ffmpeg sox".`, {
      cause: error,
    });
  }
}

function commandLine(
  reader: Reader,
  { path, facts }: { path: string; facts: WavFacts },
  rawPath: string,
): readonly [command: string, ...words: string[]] {
  if (reader === 'sox') return ['sox', '-V1', '-D', path, '-t', 'f64', rawPath];
  const told = [
    ...['-skip_initial_bytes', String(facts.dataOffset), '-f', rawFormat(facts)],
    ...['-ar', String(facts.sampleRateHz), '-ac', String(facts.channels)],
  ];
  const input = reader === 'ffmpeg' ? [] : told;
  return ['ffmpeg', '-v', 'quiet', '-y', ...input, '-i', path, '-f', 'f64le', rawPath];
}

/** ffmpeg's name of how the samples lie. */
function rawFormat({ encoding, bitsPerSample }: WavFacts): string {
  if (encoding === 'float') return `f${bitsPerSample}le`;
  return bitsPerSample === 8 ? 'u8' : `s${bitsPerSample}le`;
}
