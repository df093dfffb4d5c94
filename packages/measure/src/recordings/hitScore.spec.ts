import { hitScore, precision, recall } from './hitScore';

describe('the score of hits', () => {
  it('counts each played hit once, and only what is near', () => {
    const score = hitScore([1, 2, 3, 4], [1.01, 1.02, 2.2, 3], 0.05);
    expect(score).toEqual({ played: 4, found: 4, right: 2 });
    expect([precision(score), recall(score)]).toEqual([0.5, 0.5]);
  });

  it('is full where nothing was played and nothing found', () => {
    const score = hitScore([], [], 0.05);
    expect([precision(score), recall(score)]).toEqual([1, 1]);
  });
});
