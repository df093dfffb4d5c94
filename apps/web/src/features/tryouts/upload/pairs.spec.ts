import { groupFiles, placed, positionOfName, swapped, withoutFile, type Pair, type PairFile } from './pairs';

const file = (name: string, changed: Partial<PairFile> = {}): PairFile => ({
  id: name,
  name,
  channels: 1,
  sampleRateHz: 48_000,
  lowEndRatios: [0.5],
  ...changed,
});
const told = (pairs: readonly Pair[]) => pairs.map(({ kick, overhead }) => [kick?.fileId, overhead?.fileId]);
const grouped = (...names: string[]) => told(groupFiles(names.map((name) => file(name))));

describe('which of many files belong together', () => {
  it('goes by the rest of their names, in the order of their numbers', () => {
    expect(grouped('OH_10.wav', 'Kick_02.wav', 'Kick_10.wav', 'OH_2.wav', 'Kick_1.wav', 'OH_01.wav')).toEqual(
      [
        ['Kick_1.wav', 'OH_01.wav'],
        ['Kick_02.wav', 'OH_2.wav'],
        ['Kick_10.wav', 'OH_10.wav'],
      ],
    );
    expect(grouped('90cm overhead.wav', '90cm kick.wav', '100cm kick.wav', '100cm overhead.wav')).toEqual([
      ['90cm kick.wav', '90cm overhead.wav'],
      ['100cm kick.wav', '100cm overhead.wav'],
    ]);
  });

  it('goes by order where the numbers of the two microphones run on', () => {
    expect(grouped('kick-3.wav', 'kick-1.wav', 'oh-4.wav', 'oh-2.wav')).toEqual([
      ['kick-1.wav', 'oh-2.wav'],
      ['kick-3.wav', 'oh-4.wav'],
    ]);
  });

  it('goes two by two where names tell nothing, and the low end tells the kick', () => {
    const files = [0.1, 0.9, 0.8, 0.2].map((ratio, i) =>
      file(`ZOOM000${i + 1}.wav`, { lowEndRatios: [ratio] }),
    );
    expect(told(groupFiles(files))).toEqual([
      ['ZOOM0002.wav', 'ZOOM0001.wav'],
      ['ZOOM0003.wav', 'ZOOM0004.wav'],
    ]);
  });

  it('takes a stereo file for a take of its own', () => {
    const stereo = file('both 2.wav', { channels: 2, lowEndRatios: [0.1, 0.9] });
    const [first, second] = groupFiles([stereo, file('kick 1.wav'), file('oh 1.wav')]);
    expect(told([first])).toEqual([['kick 1.wav', 'oh 1.wav']]);
    expect(second).toMatchObject({
      kick: { fileId: 'both 2.wav', channel: 1 },
      overhead: { fileId: 'both 2.wav', channel: 0 },
    });
  });

  it('takes files without a word for a microphone for the one that isn’t named', () => {
    expect(grouped('room 1.wav', 'kick 1.wav', 'room 2.wav', 'kick 2.wav')).toEqual([
      ['kick 1.wav', 'room 1.wav'],
      ['kick 2.wav', 'room 2.wav'],
    ]);
    expect(grouped('kick 1.wav', 'kick 2.wav', 'oh 7.wav')).toEqual([
      ['kick 1.wav', 'oh 7.wav'],
      ['kick 2.wav', undefined],
    ]);
  });

  it('leaves a file alone that has no other, in its own role', () => {
    expect(grouped('kick 1.wav', 'oh 1.wav', 'oh 2.wav')).toEqual([
      ['kick 1.wav', 'oh 1.wav'],
      [undefined, 'oh 2.wav'],
    ]);
    expect(groupFiles([])).toEqual([]);
  });
});

describe('putting pairs right', () => {
  const pairs = groupFiles(['kick 1.wav', 'oh 1.wav', 'kick 2.wav', 'oh 2.wav'].map((name) => file(name)));
  const [one, two] = pairs;

  it('swaps the two of one pair', () => {
    expect(told(swapped(pairs, one.key))).toEqual([
      ['oh 1.wav', 'kick 1.wav'],
      ['kick 2.wav', 'oh 2.wav'],
    ]);
  });

  it('exchanges a file with another pair’s, and loses none', () => {
    const changed = placed(pairs, { key: one.key, role: 'overhead', fileId: 'oh 2.wav' });
    expect(told(changed)).toEqual([
      ['kick 1.wav', 'oh 2.wav'],
      ['kick 2.wav', 'oh 1.wav'],
    ]);
    expect(placed(changed, { key: two.key, role: 'overhead', fileId: 'oh 2.wav' })).toEqual(pairs);
  });

  it('fills a gap, and drops the pair that is empty then', () => {
    const gaps = groupFiles(['kick 1.wav', 'kick 3.wav', 'oh 3.wav'].map((name) => file(name)));
    expect(told(placed(gaps, { key: gaps[0].key, role: 'overhead', fileId: 'oh 3.wav' }))).toEqual([
      ['kick 1.wav', 'oh 3.wav'],
      ['kick 3.wav', undefined],
    ]);
    const halves: Pair[] = [
      { key: 'a', kick: { fileId: 'k', channel: 0 }, overhead: null },
      { key: 'b', kick: null, overhead: { fileId: 'o', channel: 0 } },
    ];
    expect(told(placed(halves, { key: 'a', role: 'overhead', fileId: 'o' }))).toEqual([['k', 'o']]);
  });

  it('goes on without a file that is cleared', () => {
    expect(told(withoutFile(pairs, 'kick 1.wav'))).toEqual([
      [undefined, 'oh 1.wav'],
      ['kick 2.wav', 'oh 2.wav'],
    ]);
    expect(withoutFile(withoutFile(pairs, 'kick 1.wav'), 'oh 1.wav')).toHaveLength(1);
  });
});

describe('a position in a name', () => {
  it('is read where it has a unit', () => {
    expect(positionOfName('kick 90cm.wav')).toBe(90);
    expect(positionOfName('OH_102.5 cm take2.wav')).toBe(102.5);
    expect(positionOfName('oh 40in.wav')).toBeCloseTo(101.6, 9);
    expect(positionOfName('kick 45 deg.wav')).toBe(45);
    expect(positionOfName('kick 02.wav')).toBeNull();
  });
});
