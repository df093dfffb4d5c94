import { hopLockstep } from './hopLockstep';
import type { TrackReading } from './trackReading';

/** A reading of hops 0, 1, 2 … in blocks of these lengths. */
const reading = (...blocks: number[]) => {
  let first = 0;
  const told = { closed: false };
  const next: TrackReading['next'] = () => {
    const count = blocks.shift();
    if (count === undefined) return Promise.resolve(null);
    const low = Float64Array.from({ length: count }, (_unused, i) => first + i);
    first += count;
    return Promise.resolve({ low, peaks: low, body: low, bright: low });
  };
  const close = () => {
    told.closed = true;
    return Promise.resolve();
  };
  return { next, close, result: () => Promise.reject(new Error('not asked for')), told };
};
const hopsOf = async (readings: TrackReading[]): Promise<number[][]> => {
  const seen: number[][] = readings.map(() => []);
  for await (const hops of hopLockstep(readings)) hops.forEach(({ low }, track) => seen[track].push(...low));
  return seen;
};

describe('hops side by side', () => {
  it('are as many of every track, however each is cut, and all of them', async () => {
    const tracks = [reading(3, 0, 4, 1), reading(1, 5, 2)];
    const all = [0, 1, 2, 3, 4, 5, 6, 7];
    expect(await hopsOf(tracks)).toEqual([all, all]);
    expect(tracks.map(({ told }) => told.closed)).toEqual([true, true]);
  });

  it('close every reading where one fails, and pass on why', async () => {
    const broken = { ...reading(), next: () => Promise.reject(new Error('the disk is gone')) };
    const sound = reading(2, 2);
    await expect(hopsOf([sound, broken])).rejects.toThrow('the disk is gone');
    expect(sound.told.closed).toBe(true);
  });
});
