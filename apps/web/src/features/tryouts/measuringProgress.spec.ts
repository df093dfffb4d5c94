import { measurement } from '../../testing/sampleData';
import { samplePlace } from '../../testing/sampleTryOut';
import { measuringProgress } from './measuringProgress';

const place = (index: number, state: 'queued' | 'running' | 'done' | 'failed', progress = 0) => {
  const sample = samplePlace(index);
  return { ...sample, take: { ...sample.take!, measurement: measurement({ state, progress }) } };
};

describe('all measurements of a try-out as one', () => {
  it('counts what has ended and adds what is under way', () => {
    const places = [
      place(0, 'done', 1),
      place(1, 'failed', 0.2),
      place(2, 'running', 0.5),
      place(3, 'queued'),
      samplePlace(4, { take: null }),
    ];
    expect(measuringProgress({ places })).toEqual({
      total: 4,
      done: 2,
      waiting: 2,
      failed: 1,
      share: 2.5 / 4,
    });
  });

  it('is nothing without takes', () => {
    expect(measuringProgress({ places: [] }).share).toBe(0);
  });
});
