import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { ffmpegRun, ownRun, type Run } from './bench/benchRuns';
import { makeGroove, writeBenchTake, type BenchTake, type Groove } from './bench/benchTake';
import {
  growthJudgement,
  judgementText,
  medianRun,
  memoryJudgement,
  runText,
  speedJudgements,
  type Judgement,
} from './bench/benchVerdict';

/**
 * Measures the whole report of a long pair beside `ffmpeg -af ebur128=peak=true` of its two files, alternately, and short
 * takes against long ones, each run in a process of its own; ends with 1 where a limit isn't kept.
 *
 * Run by `npm run bench`; the hour needs 2.1 GB in the system's temporary folder. `--quick` keeps to short takes and
 * fewer rounds, `--memory` leaves ffmpeg away. Needs Debian's `ffmpeg`.
 */
interface Plan {
  readonly rounds: number;
  /** Compared with ffmpeg. */
  readonly beside: readonly BenchTake[];
  /** Minutes of the takes whose memory is compared, at each of these rates. */
  readonly minutes: readonly [number, number];
  readonly ratesHz: readonly number[];
}

const wholePlan: Plan = {
  rounds: 5,
  beside: [
    { minutes: 10, sampleRateHz: 48_000 },
    { minutes: 10, sampleRateHz: 96_000 },
  ],
  minutes: [1, 60],
  ratesHz: [48_000, 96_000],
};
const quickPlan: Plan = {
  rounds: 3,
  beside: [{ minutes: 3, sampleRateHz: 48_000 }],
  minutes: [1, 10],
  ratesHz: [48_000],
};

async function withFolder<Result>(use: (folder: string) => Promise<Result>): Promise<Result> {
  const folder = await mkdtemp(join(tmpdir(), 'thudline-bench-'));
  try {
    return await use(folder);
  } finally {
    await rm(folder, { recursive: true, force: true });
  }
}

async function besideFfmpeg(groove: Groove, take: BenchTake, rounds: number): Promise<Judgement[]> {
  console.log(`\n${take.minutes} min, 24-bit, ${take.sampleRateHz / 1000} kHz, median of ${rounds} rounds`);
  return withFolder(async (folder) => {
    await writeBenchTake(folder, groove, take);
    const own: Run[] = [];
    const ffmpeg: Run[] = [];
    for (let round = 0; round < rounds; round += 1) {
      ffmpeg.push(await ffmpegRun(folder));
      own.push(await ownRun(folder));
    }
    console.log(runText('ffmpeg ebur128', medianRun(ffmpeg)));
    console.log(runText('the whole report', medianRun(own)));
    return [...speedJudgements(own, ffmpeg), memoryJudgement(own)];
  });
}

async function growth(groove: Groove, sampleRateHz: number, minutes: Plan['minutes']): Promise<Judgement[]> {
  console.log(`\n${minutes.join(' and ')} min, 24-bit, ${sampleRateHz / 1000} kHz`);
  const runs: Run[] = [];
  for (const length of minutes) {
    const run = await withFolder(async (folder) => {
      await writeBenchTake(folder, groove, { minutes: length, sampleRateHz });
      return ownRun(folder);
    });
    console.log(`${runText(`${length} min`, run)}, ${(run.cpuS / length).toFixed(3)} s processor a minute`);
    runs.push(run);
  }
  const [short, long] = runs;
  if (!short || !long) throw new Error('Two lengths are compared.');
  return [memoryJudgement(runs), growthJudgement({ short, long }, minutes)];
}

async function bench(words: readonly string[]): Promise<void> {
  const { rounds, beside, minutes, ratesHz } = words.includes('--quick') ? quickPlan : wholePlan;
  const groove = await withFolder(makeGroove);
  const judgements: Judgement[] = [];
  const judge = (found: readonly Judgement[]): void => {
    for (const judgement of found) console.log(judgementText(judgement));
    judgements.push(...found);
  };
  if (!words.includes('--memory')) {
    for (const take of beside) judge(await besideFfmpeg(groove, take, rounds));
  }
  for (const rateHz of ratesHz) judge(await growth(groove, rateHz, minutes));
  const isKept = judgements.every(({ passed, isMust }) => passed || !isMust);
  console.log(`\n${isKept ? 'Every limit is kept.' : 'A limit is not kept.'}`);
  process.exitCode = isKept ? 0 : 1;
}

void bench(process.argv.slice(2));
