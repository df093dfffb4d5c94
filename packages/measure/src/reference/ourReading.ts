import { fork } from 'node:child_process';
import { createWriteStream } from 'node:fs';
import { once } from 'node:events';
import { finished } from 'node:stream/promises';
import { encodeFrames, type WavFacts } from '@thudline/dsp';
import { MeasureRefusal } from '../measureRefusal';
import { withOpenFiles } from '../openFiles';

/** What became of one file in a process of its own. */
export type Reading =
  | { readonly outcome: 'read'; readonly facts: WavFacts; readonly memoryMb: number }
  | { readonly outcome: 'refused'; readonly sentence: string; readonly memoryMb: number }
  | { readonly outcome: 'failed'; readonly why: string };

const longestMs = 30_000;

/** Reads a file in a process of its own, its samples as interleaved float32 into another; ends it when it hangs. */
export async function ourReading(path: string, rawPath: string): Promise<Reading> {
  const child = fork(__filename, [path, rawPath]);
  const timer = setTimeout(() => child.kill('SIGKILL'), longestMs);
  let told: Reading | undefined;
  child.on('message', (reading: Reading) => (told = reading));
  try {
    // A child may be gone before its last word is read; that has come once the line between the two is closed.
    await Promise.all([once(child, 'exit'), once(child, 'disconnect')]);
    const { exitCode: code, signalCode: signal } = child;
    const hung = signal === 'SIGKILL' && `not read in ${longestMs / 1000} s`;
    return told ?? { outcome: 'failed', why: hung || `ended with ${code ?? signal}` };
  } finally {
    clearTimeout(timer);
  }
}

async function readAll(path: string, rawPath: string): Promise<WavFacts> {
  return withOpenFiles([path], async ([file]) => {
    if (!file) throw new Error('One file was opened, and none came.');
    const raw = createWriteStream(rawPath);
    for await (const channels of file.wav.blocks()) {
      if (!raw.write(encodeFrames(channels, 'float32'))) await once(raw, 'drain');
    }
    raw.end();
    await finished(raw);
    return file.wav.facts;
  });
}

async function tell(path: string, rawPath: string): Promise<void> {
  const memoryMb = (): number => process.resourceUsage().maxRSS / 1024;
  let reading: Reading;
  try {
    const facts = await readAll(path, rawPath);
    reading = { outcome: 'read', facts, memoryMb: memoryMb() };
  } catch (error) {
    reading =
      error instanceof MeasureRefusal
        ? { outcome: 'refused', sentence: error.message, memoryMb: memoryMb() }
        : { outcome: 'failed', why: String(error) };
  }
  process.send?.(reading);
  process.disconnect();
}

const [path, rawPath] = process.argv.slice(2);
if (require.main === module && path !== undefined && rawPath !== undefined) void tell(path, rawPath);
