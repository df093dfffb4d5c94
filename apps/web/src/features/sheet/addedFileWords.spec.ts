import { addedChoiceWords, addedFileFacts, isSameChoice } from './addedFileWords';

const choice = { flipped: true, shiftMs: 1.6, gainDb: 5.7 };
const file = {
  name: 'take-4-added.wav',
  bytes: 4_608_000,
  sha256: 'ab'.repeat(32),
  durationS: 32,
  levelDb: -3.21,
  truePeakDbtp: -1,
  listenGainDb: 0,
};

describe('words of an added file', () => {
  it('tell every part of a choice that changes something', () => {
    expect(addedChoiceWords(choice)).toBe('overhead flipped, 1.60 ms earlier, 5.7 dB louder');
    expect(addedChoiceWords({ flipped: false, shiftMs: -0.5, gainDb: -3 })).toBe(
      'overhead not flipped, 0.50 ms later, 3.0 dB quieter',
    );
    expect(addedChoiceWords({ flipped: false, shiftMs: 0.004, gainDb: 0.04 })).toBe('overhead not flipped');
  });

  it('tell how far it was turned down, and that it was not', () => {
    expect(addedFileFacts(file)).toBe(
      '24-bit WAV, 4.6 MB, turned down 3.2 dB so that no peak goes beyond −1 dBTP.',
    );
    expect(addedFileFacts({ ...file, levelDb: 0 })).toBe(
      '24-bit WAV, 4.6 MB, at the level the two add up to.',
    );
  });

  it('know the same choice again, as the server rounds it', () => {
    expect(isSameChoice(choice, { ...choice, shiftMs: 1.6004, gainDb: 5.704 })).toBe(true);
    expect(isSameChoice(choice, { ...choice, shiftMs: 1.61 })).toBe(false);
    expect(isSameChoice(choice, { ...choice, flipped: false })).toBe(false);
  });
});
