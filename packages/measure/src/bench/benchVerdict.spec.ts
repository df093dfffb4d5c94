import type { Run } from './benchRuns';
import { growthJudgement, judgementText, medianRun, memoryJudgement, speedJudgements } from './benchVerdict';

const run = (figures: Partial<Run>): Run => ({ wallS: 1, cpuS: 1, memoryMb: 100, ...figures });
const walls = (...seconds: number[]): Run[] => seconds.map((wallS) => run({ wallS }));
const words = (judgement: Parameters<typeof judgementText>[0]) => judgementText(judgement).split('  ')[0];

describe('the bench', () => {
  it('takes the median of each figure, so that one disturbed round changes nothing', () => {
    expect(medianRun(walls(2, 30, 1)).wallS).toBe(2);
    expect(medianRun([run({ memoryMb: 100 }), run({ memoryMb: 104 })]).memoryMb).toBe(102);
  });

  it('asks for no more time than ffmpeg, and aims below half of it', () => {
    const told = (ours: number) => speedJudgements(walls(ours, ours), walls(2, 2)).map(words);
    expect(told(2.1)).toEqual(['FAIL', 'not yet']);
    expect(told(2)).toEqual(['pass', 'not yet']);
    expect(told(0.9)).toEqual(['pass', 'pass']);
  });

  it('judges memory by the run that took most', () => {
    expect(words(memoryJudgement([run({ memoryMb: 299 }), run({ memoryMb: 90 })]))).toBe('pass');
    expect(words(memoryJudgement([run({ memoryMb: 90 }), run({ memoryMb: 300 })]))).toBe('FAIL');
  });

  it('lets memory grow by a fifth from the short take to the long one', () => {
    const told = (memoryMb: number) =>
      words(growthJudgement({ short: run({}), long: run({ memoryMb }) }, [1, 60]));
    expect([told(120), told(121)]).toEqual(['pass', 'FAIL']);
  });
});
