import type { Run } from './benchRuns';

/** One line of the verdict. */
export interface Judgement {
  readonly passed: boolean;
  /** What is aimed at fails nothing. */
  readonly isMust: boolean;
  readonly text: string;
}

/** docs/measurements.md, "Speed and memory"; half of ffmpeg's time is the aim beyond it. */
const mostRatio = 1;
const aimedRatio = 0.5;
const mostMb = 300;
const mostGrowth = 1.2;

/** @param runs - at least one */
export function medianRun(runs: readonly Run[]): Run {
  const middle = (figure: keyof Run): number => {
    const sorted = runs.map((run) => run[figure]).sort((a, b) => a - b);
    const [low, high] = [sorted[(sorted.length - 1) >> 1], sorted[sorted.length >> 1]];
    return ((low ?? NaN) + (high ?? NaN)) / 2;
  };
  return { wallS: middle('wallS'), cpuS: middle('cpuS'), memoryMb: middle('memoryMb') };
}

/** The same files measured by both, alternately: the median of our times over the median of theirs. */
export function speedJudgements(own: readonly Run[], ffmpeg: readonly Run[]): Judgement[] {
  const [ours, theirs] = [medianRun(own), medianRun(ffmpeg)];
  const wall = ours.wallS / theirs.wallS;
  const text = `wall time ${wall.toFixed(2)} of ffmpeg's (processor time ${(ours.cpuS / theirs.cpuS).toFixed(2)})`;
  return [
    { passed: wall <= mostRatio, isMust: true, text: `${text}, at most ${mostRatio}` },
    { passed: wall < aimedRatio, isMust: false, text: `${text}, aim below ${aimedRatio}` },
  ];
}

/** The most that any run took. */
export function memoryJudgement(runs: readonly Run[]): Judgement {
  const most = Math.max(...runs.map(({ memoryMb }) => memoryMb));
  return { passed: most < mostMb, isMust: true, text: `memory ${most.toFixed(0)} MB, below ${mostMb}` };
}

/** @param minutes - of the two takes */
export function growthJudgement(
  { short, long }: { short: Run; long: Run },
  minutes: readonly [number, number],
): Judgement {
  const growth = long.memoryMb / short.memoryMb;
  const text = `memory from ${minutes[0]} to ${minutes[1]} min ×${growth.toFixed(2)}, at most ×${mostGrowth}`;
  return { passed: growth <= mostGrowth, isMust: true, text };
}

export function judgementText({ passed, isMust, text }: Judgement): string {
  return `${passed ? 'pass' : isMust ? 'FAIL' : 'not yet'}  ${text}`;
}

export function runText(name: string, { wallS, cpuS, memoryMb }: Run): string {
  return `${name.padEnd(24)}${wallS.toFixed(2)} s wall, ${cpuS.toFixed(2)} s processor, ${memoryMb.toFixed(0)} MB`;
}
