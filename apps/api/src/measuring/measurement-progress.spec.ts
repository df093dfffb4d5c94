import { measurementStages } from '@thudline/contracts';
import { wholeProgress } from './measurement-progress';

describe('wholeProgress', () => {
  it('never goes back from stage to stage and stays below 1', () => {
    const walked = measurementStages.flatMap((stage) =>
      [0, 0.5, 1].map((within) => wholeProgress(stage, within)),
    );
    expect(walked).toEqual([...walked].sort((a, b) => a - b));
    expect(walked.at(0)).toBe(0);
    expect(walked.at(-1)).toBeLessThan(1);
  });

  it('holds what is out of range at the ends of its stage', () => {
    expect(wholeProgress('levels', -1)).toBe(wholeProgress('levels', 0));
    expect(wholeProgress('levels', 7)).toBe(wholeProgress('levels', 1));
  });
});
