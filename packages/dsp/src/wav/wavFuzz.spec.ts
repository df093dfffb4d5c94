import type { ByteSource } from '../trackSource';
import { openWav } from './openWav';
import { WavError } from './wavError';
import { mutatedWav, seededRandom } from './testing/mutateWav';

const files = 10_000;
/** As much as is asked for at once: a block of sound, or the window in which chunks are looked for. */
const largestRead = 256 * 1024;

/** A source that says how it was read. */
function watchedSource(bytes: Uint8Array): ByteSource & { reads: number; largest: number } {
  return {
    sizeBytes: bytes.length,
    reads: 0,
    largest: 0,
    read(start, end) {
      if (!(start >= 0 && end >= start && end <= bytes.length)) {
        throw new RangeError(`Asked for bytes ${start} to ${end} of ${bytes.length}.`);
      }
      this.reads++;
      this.largest = Math.max(this.largest, end - start);
      return Promise.resolve(bytes.subarray(start, end));
    },
  };
}

/** Reads the last channel to its end. @returns whether it was read; refusing is no failure */
async function readOrRefused(bytes: Uint8Array): Promise<'read' | 'refused'> {
  const source = watchedSource(bytes);
  try {
    const file = await openWav(source);
    const { facts } = file;
    expect(facts.dataOffset + facts.frames * facts.blockAlign).toBeLessThanOrEqual(bytes.length);
    let frames = 0;
    let isFinite = true;
    for await (const block of file.track(facts.channels - 1).blocks()) {
      frames += block.length;
      isFinite &&= block.every((sample) => Number.isFinite(sample));
    }
    expect({ frames, isFinite }).toEqual({ frames: facts.frames, isFinite: true });
    expect(facts.broadcast?.description ?? '').toMatch(/^[^\p{Cc}]{0,256}$/u);
    return 'read';
  } catch (error) {
    if (!(error instanceof WavError)) throw error;
    expect(error.message).toMatch(/^[A-Z].*\.$/);
    return 'refused';
  } finally {
    expect(source.largest).toBeLessThanOrEqual(largestRead);
    // A file this small lies in one window; sound is read once.
    expect(source.reads).toBeLessThanOrEqual(3);
  }
}

it(`reads or refuses ${files} damaged files, within what the file holds`, async () => {
  const random = seededRandom(20261201);
  const outcomes = { read: 0, refused: 0 };
  for (let i = 0; i < files; i++) outcomes[await readOrRefused(mutatedWav(random))]++;
  // Both ends of the reader were met: neither everything refused nor everything let through.
  expect(outcomes.read).toBeGreaterThan(files / 10);
  expect(outcomes.refused).toBeGreaterThan(files / 10);
});
