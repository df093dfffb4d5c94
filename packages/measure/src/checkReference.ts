import { execFile } from 'node:child_process';
import { existsSync } from 'node:fs';
import { mkdtemp, readdir, rm, stat } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { extname, join } from 'node:path';
import { promisify } from 'node:util';
import { createTrackLevel } from '@thudline/dsp';
import { MeasureRefusal } from './measureRefusal';
import { withOpenFiles } from './openFiles';
import { comparison, comparisonText } from './reference/comparison';
import { ffmpegFigures, soxFigures, type ToolFigures } from './reference/toolFigures';

/**
 * Puts our levels of the first channel of WAV files beside those of ffmpeg (`ebur128`, `astats`) and SoX (`stats`), and ends
 * with 1 where one lies further off than rounding explains.
 *
 * Run by `npm run check:reference [-- folder or file …]`; without any it makes three of the fixtures' takes, and reads
 * `../shared/recordings` too where that is. Needs Debian's `ffmpeg` and `sox`.
 */
const execute = promisify(execFile);
const writeTakes = join(__dirname, '../../../fixtures/dist/writeTakes.js');
const recordings = join(__dirname, '../../../../shared/recordings');
const scenarios = ['good', 'clipped', 'heater-off-lamp-on'];

/** @returns what it prints on standard error; null where it ends with a refusal of its own, which is said */
async function run(command: string, words: readonly string[]): Promise<string | null> {
  try {
    return (await execute(command, words)).stderr;
  } catch (error) {
    const { code } = error as { code?: unknown };
    if (typeof code === 'number') {
      console.log(`  ${command} can't read this file`);
      return null;
    }
    if (code !== 'ENOENT') throw error;
    throw new Error(`${command} is not here; install it with "apt-get install ffmpeg sox".`, {
      cause: error,
    });
  }
}

async function wavFiles(path: string): Promise<string[]> {
  if (!(await stat(path)).isDirectory()) return [path];
  const entries = await readdir(path, { recursive: true });
  return entries.filter((name) => extname(name).toLowerCase() === '.wav').map((name) => join(path, name));
}

async function ourFigures(path: string): Promise<{ figures: ToolFigures; sampleRateHz: number }> {
  return withOpenFiles([path], async ([file]) => {
    if (!file) throw new Error('One file was opened, and none came.');
    const track = file.wav.track(0);
    const level = createTrackLevel(track);
    for await (const block of track.blocks()) level.push(block);
    const { samplePeakDbfs, rmsDbfs, dcOffset, truePeakDbtp, integratedLufs } = level.result();
    return {
      sampleRateHz: track.sampleRateHz,
      figures: {
        samplePeakDbfs,
        rmsDbfs,
        dcOffset,
        truePeakDbtp: truePeakDbtp ?? null,
        integratedLufs: integratedLufs ?? null,
      },
    };
  });
}

async function ffmpeg(path: string): Promise<ToolFigures | null> {
  const filters =
    'pan=mono|c0=c0,ebur128=peak=true:framelog=verbose,astats=measure_perchannel=none:measure_overall=all';
  const words = ['-hide_banner', '-nostats', '-i', path, '-af', filters, '-f', 'null', '-'];
  const text = await run('ffmpeg', words);
  return text === null ? null : ffmpegFigures(text);
}

async function sox(path: string): Promise<ToolFigures | null> {
  const text = await run('sox', [path, '-n', 'remix', '1', 'stats']);
  return text === null ? null : soxFigures(text);
}

/** @returns how many figures are off */
async function checkFile(path: string): Promise<number> {
  console.log(path);
  let ours: Awaited<ReturnType<typeof ourFigures>>;
  try {
    ours = await ourFigures(path);
  } catch (error) {
    if (!(error instanceof MeasureRefusal)) throw error;
    console.log(`  refused: ${error.message}`);
    return 0;
  }
  // SoX cuts float files off at full scale, so their overs can't be compared.
  const isOver = (ours.figures.samplePeakDbfs ?? 0) > 0;
  const read = [
    { tool: 'ffmpeg', figures: await ffmpeg(path) },
    { tool: 'sox', figures: isOver ? null : await sox(path) },
  ];
  const rows = read.flatMap(({ tool, figures }) =>
    figures ? comparison(ours.figures, { tool, figures }, ours.sampleRateHz) : [],
  );
  for (const row of rows) console.log(comparisonText(row));
  return rows.filter(({ isWithin }) => !isWithin).length;
}

async function check(paths: readonly string[]): Promise<void> {
  const files = (await Promise.all(paths.map(wavFiles))).flat();
  console.log(`  ${'figure'.padEnd(20)}${'tool'.padEnd(10)}        ours      theirs  difference`);
  let off = 0;
  for (const file of files) off += await checkFile(file);
  console.log(`${files.length} files, ${off === 0 ? 'no figure' : `${off} figures`} off`);
  process.exitCode = off === 0 && files.length > 0 ? 0 : 1;
}

async function main(paths: readonly string[]): Promise<void> {
  if (paths.length > 0) return check(paths);
  const folder = await mkdtemp(join(tmpdir(), 'thudline-reference-'));
  try {
    await execute(process.execPath, [writeTakes, folder, ...scenarios]);
    await check(existsSync(recordings) ? [folder, recordings] : [folder]);
  } finally {
    await rm(folder, { recursive: true, force: true });
  }
}

void main(process.argv.slice(2));
