import { bytesSource } from './bytesSource';
import { openWav } from './openWav';
import { WavError } from './wavError';
import { chunk, fmt, pcmGuid, riff } from './testing/handMadeWav';

const mutations = 4000;

/** A linear congruential generator (Numerical Recipes' constants), so that a failure can be run again. */
function seededRandom(seed: number): (below: number) => number {
  let state = seed >>> 0;
  return (below) => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    return Math.floor((state / 2 ** 32) * below);
  };
}

const sound = chunk('data', new Uint8Array(600).fill(77));
const originals = [
  riff([fmt({ channels: 2 }), sound]),
  riff([chunk('LIST', new Uint8Array(9)), fmt({ bits: 24 }), sound, chunk('bext', new Uint8Array(31))]),
  riff([fmt({ bits: 32, extensible: { validBits: 24, guid: pcmGuid } }), sound]),
  riff([chunk('ds64', new Uint8Array(28)), fmt({ bits: 64, tag: 3 }), sound], 'RF64'),
];

const nasty = [0, 1, 0x7f, 0x80, 0xff];

function mutated(random: (below: number) => number): Uint8Array {
  const bytes = originals[random(originals.length)].slice();
  // Most headers lie in the first 100 bytes; a few bytes each, and now and then the end is missing.
  for (let i = random(6); i >= 0; i--) {
    bytes[random(Math.min(100, bytes.length))] = random(2) ? nasty[random(nasty.length)] : random(256);
  }
  return random(4) ? bytes : bytes.subarray(0, random(bytes.length));
}

it(`reads or refuses ${mutations} damaged files, within what the file holds`, async () => {
  const random = seededRandom(20261201);
  let read = 0;
  for (let i = 0; i < mutations; i++) {
    const bytes = mutated(random);
    try {
      const file = await openWav(bytesSource(bytes));
      expect(file.facts.dataOffset + file.facts.frames * file.facts.blockAlign).toBeLessThanOrEqual(
        bytes.length,
      );
      let frames = 0;
      for await (const block of file.track(file.facts.channels - 1).blocks()) {
        frames += block.length;
        expect(block.every((sample) => Number.isFinite(sample))).toBe(true);
      }
      expect(frames).toBe(file.facts.frames);
      read++;
    } catch (error) {
      if (!(error instanceof WavError)) throw error;
    }
  }
  // Both ends of the reader were met: neither everything refused nor everything let through.
  expect(read).toBeGreaterThan(mutations / 10);
  expect(read).toBeLessThan(mutations * 0.9);
});
