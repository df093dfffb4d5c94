import { bytesSource } from '../wav/bytesSource';
import { encodeWav } from '../wav/encodeWav';
import { openWav } from '../wav/openWav';
import { guessRoles, guessSides, roleInName, stemOfName } from './guessRoles';
import { lowEndRatio } from './lowEndRatio';

const files = (first: string, second: string, ratios: [number | null, number | null] = [null, null]) =>
  guessRoles([
    { name: first, lowEndRatio: ratios[0] },
    { name: second, lowEndRatio: ratios[1] },
  ]).map(({ role, reason }) => `${role} by ${reason}`);

const kickFirst = ['kick by name', 'overhead by name'];
const kickSecond = ['overhead by name', 'kick by name'];

describe('guessRoles', () => {
  it.each([
    ['kick.wav', 'overhead.wav', kickFirst],
    ['OH.wav', 'BD.wav', kickSecond],
    ['k_01.wav', 'o_01.wav', kickFirst],
    ['take3-BassDrum.wav', 'take3-Top.wav', kickFirst],
    ['Bass Drum 2.WAV', 'Audio 2.WAV', kickFirst],
    ['01 Over.wav', '02 Track.wav', kickSecond],
    ['myKickIn_03.wav', 'myOverheads_03.wav', kickFirst],
  ])('reads names: %s and %s', (first, second, expected) => {
    expect(files(first, second)).toEqual(expected);
  });

  it('lets names win over the low end', () => {
    expect(files('overhead.wav', 'kick.wav', [0.9, 0.1])).toEqual(kickSecond);
  });

  it('takes the file with more low end where names say nothing, both or the same', () => {
    expect(files('1.wav', '2.wav', [0.1, 0.7])).toEqual(['overhead by low-end', 'kick by low-end']);
    expect(files('kick a.wav', 'kick b.wav', [0.7, 0.1])).toEqual(['kick by low-end', 'overhead by low-end']);
    expect(files('kick overhead 1.wav', 'kick overhead 2.wav', [0.1, 0.7])[1]).toBe('kick by low-end');
  });

  it('takes the order where nothing tells', () => {
    expect(files('1.wav', '2.wav')).toEqual(['kick by order', 'overhead by order']);
    expect(files('1.wav', '2.wav', [0.5, 0.52])).toEqual(['kick by order', 'overhead by order']);
  });

  it('does not find a word inside another', () => {
    expect(files('abduct.wav', 'ohm.wav')).toEqual(['kick by order', 'overhead by order']);
  });

  it('guesses a lone file, and none', () => {
    expect(guessRoles([{ name: 'oh.wav', lowEndRatio: null }])).toEqual([
      { role: 'overhead', reason: 'name' },
    ]);
    expect(guessRoles([])).toEqual([]);
  });
});

describe('guessSides', () => {
  it('reads the order of both words, then the low end, then takes the left side', () => {
    expect(guessSides('overhead-kick.wav', [0.9, 0.1])).toEqual({
      kickChannel: 1,
      overheadChannel: 0,
      reason: 'name',
    });
    expect(guessSides('take 4.wav', [0.1, 0.8])).toEqual({
      kickChannel: 1,
      overheadChannel: 0,
      reason: 'low-end',
    });
    expect(guessSides('take 4.wav', [null, 0.8])).toEqual({
      kickChannel: 0,
      overheadChannel: 1,
      reason: 'order',
    });
  });
});

describe('what is left of a name', () => {
  it('is the same for both microphones of one take', () => {
    for (const [kick, overhead, stem] of [
      ['Kick 03.wav', 'OH 3.wav', '3'],
      ['Take3_BassDrum-02.wav', 'Take3_Overhead-02.wav', 'take 3 2'],
      ['90cm kick.wav', '90cm_oh.WAV', '90 cm'],
      ['kick102.5 cm.wav', 'top 102.5cm.wav', '102.5 cm'],
    ])
      expect([stemOfName(kick), stemOfName(overhead)]).toEqual([stem, stem]);
  });

  it('is everything where no microphone is named, and nothing where only one is', () => {
    expect(stemOfName('ZOOM0001.wav')).toBe('zoom 1');
    expect(stemOfName('kick.wav')).toBe('');
  });

  it('goes with one microphone, or with none or both', () => {
    expect(['Kick 1.wav', 'oh.wav', 'room.wav', 'kick-oh.wav'].map(roleInName)).toEqual([
      'kick',
      'overhead',
      null,
      null,
    ]);
  });
});

describe('lowEndRatio', () => {
  const sampleRateHz = 48000;
  const ratio = async (sample: (seconds: number) => number, seconds = 1) => {
    const samples = Float32Array.from({ length: seconds * sampleRateHz }, (_, i) => sample(i / sampleRateHz));
    const file = await openWav(
      bytesSource(encodeWav({ channels: [samples], sampleRateHz, bitDepth: 'float32' })),
    );
    return lowEndRatio(file.track(0));
  };
  const tone = (hz: number) => (seconds: number) => 0.3 * Math.sin(2 * Math.PI * hz * seconds);

  it('is near 1 for a low tone, near 0 for a high one and a half for both at once', async () => {
    expect(await ratio(tone(60))).toBeGreaterThan(0.95);
    expect(await ratio(tone(3000))).toBeLessThan(0.01);
    // Within what a 12 dB/octave filter takes from 60 Hz.
    expect(await ratio((s) => tone(60)(s) + tone(3000)(s))).toBeCloseTo(0.5, 1);
  });

  it('does not take a constant offset for low end', async () => {
    expect(await ratio((s) => 0.3 + tone(3000)(s), 4)).toBeLessThan(0.05);
  });

  it('cannot be told for silence', async () => {
    expect(await ratio(() => 0)).toBeNull();
  });
});
