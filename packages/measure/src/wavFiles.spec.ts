import { existsSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import type { WavRefusal } from '@thudline/dsp';
import { withOpenFiles } from './openFiles';

/** Files by many programs, some damaged on purpose; they stay where they are (recordings/README). */
const folder = join(__dirname, '../../../../shared/recordings/wav-files');

/** Everything else in the folder is read. */
const refused: Readonly<Record<string, WavRefusal>> = {
  'hound__crash-24728523ef4be15c838293b676f6853e73723bf4.wav': 'cut-off',
  'hound__crash-cbd757427cea12bd8a21f86cd8cf74d98ce56bee.wav': 'cut-off',
  'hound__crash-e879de4eb4d206c59e21f0e01def16457af80fdc.wav': 'cut-off',
  'hound__pcmwaveformat-24bit-4byte-48kHz-stereo.wav': 'damaged',
  'ima_adpcm_fact_after_data.wav': 'encoding',
  'libbw64__rect_24bit_nowave.wav': 'not-wav',
  'mulaw_fact.wav': 'encoding',
  'scipy__test-1234Hz-le-1ch-10S-20bit-extra.wav': 'rate',
  'scipy__test-44100Hz-le-1ch-4bytes-early-eof-no-data.wav': 'no-frames',
  'scipy__test-44100Hz-le-1ch-4bytes-incomplete-chunk.wav': 'cut-off',
  'scipy__test-8000Hz-be-3ch-5S-24bit.wav': 'container',
  'scipy__test-8000Hz-le-3ch-5S-36bit.wav': 'encoding',
  'scipy__test-8000Hz-le-3ch-5S-53bit.wav': 'encoding',
};

/** Reads every channel to its end. @returns frames read, or the refusal */
async function readThrough(path: string) {
  return withOpenFiles([path], async ([{ wav }]) => {
    let frames = 0;
    for await (const channels of wav.blocks()) {
      expect(channels.every((block) => block.every(Number.isFinite))).toBe(true);
      frames += channels[0].length;
    }
    expect(frames).toBe(wav.facts.frames);
    return 'read';
  }).catch((error: unknown) => error);
}

const names = existsSync(folder) ? readdirSync(folder).filter((name) => name.endsWith('.wav')) : [];

if (names.length === 0) {
  it('left out: ../shared/recordings/wav-files is not here', () => expect(names).toEqual([]));
} else {
  it.each(names)('reads %s whole, or refuses it with one sentence', async (name) => {
    const outcome = await readThrough(join(folder, name));
    const reason = refused[name];
    if (reason === undefined) expect(outcome).toBe('read');
    else
      expect(outcome).toMatchObject({
        code: 'wav-refused',
        reason,
        message: expect.stringMatching(/^[A-Z][^.]*\.$/) as string,
      });
  });
}
