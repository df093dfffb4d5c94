import { createSampleComparison, type Reader } from './sampleComparison';

const compared = (
  facts: { encoding: 'pcm' | 'float'; validBits: number },
  reader: Reader,
  pairs: readonly (readonly [ours: number, theirs: number])[],
) => {
  const comparison = createSampleComparison(facts, reader);
  comparison.push(
    Float32Array.from(pairs, ([ours]) => ours),
    Float64Array.from(pairs, ([, theirs]) => theirs),
  );
  return comparison.result();
};
const pcm16 = { encoding: 'pcm', validBits: 16 } as const;
const float = { encoding: 'float', validBits: 32 } as const;

describe('samples beside another reader’s', () => {
  it('may lie one step of the file’s depth apart, not more', () => {
    expect(compared(pcm16, 'ffmpeg', [[0.5, 0.5 + 2 ** -15]])).toEqual({ largestLsb: 1, isWithin: true });
    expect(compared(pcm16, 'sox', [[0.5, 0.5 + 2 ** -14]])).toEqual({ largestLsb: 2, isWithin: false });
  });

  it('may differ by what a float32 can’t hold of 32-bit integers', () => {
    const value = 0.7 + 2 ** -31;
    const pcm32 = { encoding: 'pcm', validBits: 32 } as const;
    expect(compared(pcm32, 'ffmpeg', [[value, value]]).isWithin).toBe(true);
    expect(compared(pcm32, 'ffmpeg', [[value, value + 2 ** -23]]).isWithin).toBe(false);
  });

  it('are the same in float files, but for overs that SoX cuts off', () => {
    expect(compared(float, 'ffmpeg', [[0.25, 0.25]])).toEqual({ largestLsb: 0, isWithin: true });
    expect(compared(float, 'ffmpeg', [[2 ** -40, 2 ** -41]]).isWithin).toBe(false);
    expect(compared(float, 'ffmpeg', [[1.5, 1]]).isWithin).toBe(false);
    expect(compared(float, 'sox', [[1.5, 1 - 2 ** -31]]).isWithin).toBe(true);
  });

  it('fail on what is no number', () => {
    expect(compared(float, 'ffmpeg', [[0, NaN]]).isWithin).toBe(false);
  });
});
