import { takeFacts } from '../../testing/takeFacts';
import { compareTakes } from './compareTakes';
import { pooledTakes } from './pooledTakes';

const decayOf = (before: Parameters<typeof pooledTakes>[0], after: Parameters<typeof pooledTakes>[0]) => {
  const sides = { before: pooledTakes(before), after: pooledTakes(after) };
  return compareTakes({ ...sides, gainKnownSame: false }).find(({ key }) => key === 'decay-500')!;
};

describe('several takes of one side', () => {
  it('tell together what each alone has too few hits for', () => {
    const take = (seed: number, decayS: number) => takeFacts({ seed, decayS, drums: 4 });
    expect(decayOf([take(1, 0.6)], [take(2, 0.5)])).toMatchObject({ reason: 'too-few-hits' });
    const pooled = decayOf([take(1, 0.6), take(3, 0.6)], [take(2, 0.5), take(4, 0.5)]);
    expect(pooled).toMatchObject({ clear: true, word: 'shorter', hitsBefore: 8, hitsAfter: 8 });
  });

  it('are the take itself where it is one, and leave what they are given unchanged', () => {
    const take = takeFacts();
    const copy = structuredClone(take);
    expect(pooledTakes([take])).toBe(take);
    pooledTakes([take, takeFacts({ seed: 2 })]);
    expect(take).toEqual(copy);
  });

  it('have the middle of their noise, and none where no take has', () => {
    const noise = (...levels: (number | null)[]) =>
      pooledTakes(levels.map((noiseDbfs) => takeFacts({ noiseDbfs }))).tracks[1].noiseFloorDbfs;
    expect(noise(-70, -60, -72)).toBe(-70);
    expect(noise(null, -60)).toBe(-60);
    expect(noise(null, null)).toBeNull();
  });

  it('are at least one', () => {
    expect(() => pooledTakes([])).toThrow('no take');
  });
});
