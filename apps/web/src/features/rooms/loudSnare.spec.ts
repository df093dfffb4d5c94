import { loudSnare } from './loudSnare';

const hit = (timeS: number, kind: 'kick' | 'drum' | 'cymbal', overheadPeakDbfs: number | null) => ({
  timeS,
  kind,
  kickPeakDbfs: -10,
  overheadPeakDbfs,
});

it('the snare to hear is the loudest drum that is no kick', () => {
  const kick = hit(1, 'kick', -3);
  const cymbal = hit(5, 'cymbal', -2);
  const drums = [hit(2, 'drum', -12), hit(3, 'drum', -9), hit(4, 'drum', null)];
  expect(loudSnare([kick, ...drums, cymbal])?.timeS).toBe(3);
  expect(loudSnare([kick, cymbal])).toBeUndefined();
});
