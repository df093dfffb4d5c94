import type { WavFacts } from '@thudline/dsp';
import {
  aboutTimeLeft,
  afterColon,
  factsWords,
  foreignFileWords,
  limitWords,
  sentWords,
  shortTimeLeft,
  sizeWords,
} from './uploadWords';

const facts = (overrides: Partial<WavFacts>): WavFacts => ({
  encoding: 'pcm',
  bitsPerSample: 24,
  validBits: 24,
  channels: 1,
  sampleRateHz: 48_000,
  frames: 2_496_000,
  dataOffset: 44,
  blockAlign: 3,
  cutShort: false,
  durationS: 52,
  encodingName: '24-bit PCM',
  broadcast: null,
  ...overrides,
});

describe('words of the upload page', () => {
  it('tells a file in one line', () => {
    expect(factsWords(facts({}))).toBe('24-bit, 48 kHz, mono, 0:52');
    expect(
      factsWords(
        facts({ encoding: 'float', validBits: 32, sampleRateHz: 44_100, channels: 2, durationS: 605 }),
      ),
    ).toBe('32-bit float, 44.1 kHz, stereo, 10:05');
    expect(factsWords(facts({ sampleRateHz: 11_025, channels: 6 }))).toBe(
      '24-bit, 11.025 kHz, 6 channels, 0:52',
    );
  });
  it('tells what is known of a file that is no WAV', () => {
    expect(foreignFileWords({ name: 'room phone.m4a', size: 900_000 })).toBe('M4A, 900 kB');
    expect(foreignFileWords({ name: 'kick', size: 1_500_000 })).toBe('1.5 MB');
    expect(foreignFileWords({ name: 'empty.wav', size: 0 })).toBe('WAV, no bytes');
  });
  it('tells bytes in one unit', () => {
    expect(sizeWords(999_600)).toBe('1.0 MB');
    expect(sentWords(6_100_000, 7_500_000)).toBe('6.1 of 7.5 MB');
    expect(sentWords(120_400, 800_000)).toBe('120 of 800 kB');
    expect(sentWords(7_500_000, 7_500_000)).toBe('7.5 MB');
    expect(limitWords).toBe('512 MB');
  });
  it('tells the time left, short and as a sentence', () => {
    expect([null, 0, 8.2, 99, 130].map(shortTimeLeft)).toEqual([
      '',
      'sent',
      '9 s left',
      '99 s left',
      '3 min left',
    ]);
    expect([null, 4, 31, 90, 91].map(aboutTimeLeft)).toEqual([
      '',
      'A few seconds left.',
      'About 40 seconds left.',
      'About 90 seconds left.',
      'About 2 minutes left.',
    ]);
  });
  it('goes on in small letters after a colon, except where a name begins', () => {
    expect(afterColon('This is an MP3 file.')).toBe('this is an MP3 file.');
    expect(afterColon('RIFF without sound.')).toBe('RIFF without sound.');
    expect(afterColon('kick.wav is empty.')).toBe('kick.wav is empty.');
  });
});
