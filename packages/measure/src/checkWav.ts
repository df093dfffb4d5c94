import { existsSync } from 'node:fs';
import { mkdtemp, readdir, rm, stat } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { basename, extname, join } from 'node:path';
import type { WavFacts } from '@thudline/dsp';
import { fileByteSource } from './fileByteSource';
import { writeSamples } from './reference/otherReaders';
import { ourReading } from './reference/ourReading';
import { createSampleComparison, type Reader } from './reference/sampleComparison';

/**
 * Reads every WAV file of a folder beside ffmpeg and SoX: to the same samples, or refused with one sentence; never a crash,
 * a hang, or more than 300 MB.
 *
 * Run by `npm run check:wav [-- folder or file …]`, of itself on `../shared/recordings/wav-files` where that is. Needs
 * Debian's `ffmpeg` and `sox`. Where neither reads a file, ffmpeg is told where the sound lies and how.
 */
const ownFolder = join(__dirname, '../../../../shared/recordings/wav-files');
const mostMb = 300;
const blockSamples = 64 * 1024;
const atOnce = 4;
const legend =
  'LSB: one step of the file, of 24 bits for float. Ours are float32, so beyond 24 bits theirs can lie up to 2^(bits − 25) steps away.';

interface Row {
  readonly isWithin: boolean;
  readonly text: string;
}

/** @returns the largest difference; null where the other reader found more or fewer samples */
async function compared(
  rawPaths: { ours: string; theirs: string },
  facts: WavFacts,
  reader: Reader,
): Promise<{ largestLsb: number; isWithin: boolean } | null> {
  const ours = await fileByteSource(rawPaths.ours);
  const theirs = await fileByteSource(rawPaths.theirs);
  try {
    if (ours.sizeBytes * 2 !== theirs.sizeBytes) return null;
    const comparison = createSampleComparison(facts, reader);
    for (let first = 0; first < ours.sizeBytes / 4; first += blockSamples) {
      const [a, b] = [
        await ours.read(first * 4, (first + blockSamples) * 4),
        await theirs.read(first * 8, (first + blockSamples) * 8),
      ];
      comparison.push(new Float32Array(new Uint8Array(a).buffer), new Float64Array(new Uint8Array(b).buffer));
    }
    return comparison.result();
  } finally {
    await Promise.all([ours.close(), theirs.close()]);
  }
}

async function besideReaders(path: string, facts: WavFacts, folder: string): Promise<Row> {
  const cells: string[] = [];
  let isWithin = true;
  let isCompared = false;
  for (const reader of ['ffmpeg', 'sox', 'ffmpeg, told where the sound lies'] as const) {
    if (isCompared && reader !== 'sox') continue;
    const theirs = join(folder, 'theirs.raw');
    if (!(await writeSamples(reader, { path, facts }, theirs)) || (await stat(theirs)).size === 0) {
      cells.push(`${reader} can't read it`);
      continue;
    }
    const difference = await compared({ ours: join(folder, 'ours.raw'), theirs }, facts, reader);
    isWithin &&= difference?.isWithin === true;
    isCompared = true;
    const apart = difference && Number(difference.largestLsb.toPrecision(2));
    cells.push(apart === null ? `${reader} reads another length` : `${reader} ${apart} LSB apart`);
  }
  return { isWithin: isWithin && isCompared, text: cells.join(', ') };
}

async function checkFile(path: string, folder: string): Promise<Row> {
  const rawPath = join(folder, 'ours.raw');
  const reading = await ourReading(path, rawPath);
  if (reading.outcome === 'failed') return { isWithin: false, text: reading.why };
  const memory = `${reading.memoryMb.toFixed(0)} MB`;
  const isSmall = reading.memoryMb < mostMb;
  if (reading.outcome === 'refused') {
    const isSentence = /^[A-Z][^.]*\.$/.test(reading.sentence);
    return { isWithin: isSmall && isSentence, text: `${memory}, refused: ${reading.sentence}` };
  }
  const { facts } = reading;
  const { isWithin, text } = await besideReaders(path, facts, folder);
  const what = `${facts.channels} × ${facts.frames}, ${facts.encodingName}${facts.cutShort ? ', cut short' : ''}`;
  return { isWithin: isSmall && isWithin, text: `${memory}, ${what}: ${text}` };
}

async function wavFiles(path: string): Promise<string[]> {
  if (!(await stat(path)).isDirectory()) return [path];
  const entries = await readdir(path, { recursive: true });
  return entries.filter((name) => extname(name).toLowerCase() === '.wav').map((name) => join(path, name));
}

async function check(file: string): Promise<Row & { readonly file: string }> {
  const folder = await mkdtemp(join(tmpdir(), 'thudline-wav-'));
  try {
    return { file, ...(await checkFile(file, folder)) };
  } finally {
    await rm(folder, { recursive: true, force: true });
  }
}

async function main(paths: readonly string[]): Promise<void> {
  if (paths.length === 0) {
    console.log('Left out: ../shared/recordings/wav-files is not here; name a folder of WAV files.');
    return;
  }
  const files = (await Promise.all(paths.map(wavFiles))).flat();
  let off = 0;
  console.log(legend);
  for (let i = 0; i < files.length; i += atOnce) {
    for (const { file, isWithin, text } of await Promise.all(files.slice(i, i + atOnce).map(check))) {
      if (!isWithin) off++;
      console.log(`${isWithin ? 'pass' : 'FAIL'}  ${basename(file)}\n      ${text}`);
    }
  }
  console.log(`${files.length} files, ${files.length - off} pass, ${off} fail`);
  process.exitCode = off === 0 && files.length > 0 ? 0 : 1;
}

const named = process.argv.slice(2);
void main(named.length === 0 && existsSync(ownFolder) ? [ownFolder] : named);
