import { encodeWav } from '../../wav/encodeWav';
import { bytesSource } from '../../wav/bytesSource';
import { openWav } from '../../wav/openWav';
import { seededNoise } from '../level/testing/seededNoise';
import { addedTrack } from './addedTrack';
import { shiftedSamples } from './shiftedSamples';

const sampleRateHz = 48000;
const track = async (samples: Float32Array, rateHz = sampleRateHz) =>
  (
    await openWav(bytesSource(encodeWav({ channels: [samples], sampleRateHz: rateHz, bitDepth: 'float32' })))
  ).track(0);
const whole = async (source: Awaited<ReturnType<typeof track>>) => {
  const all: number[] = [];
  for await (const block of source.blocks()) for (const sample of block) all.push(sample);
  return all;
};
// Longer than one block, so that a seam lies inside.
const kick = seededNoise({ length: 70_000, rms: 0.1, seed: 1 });
const overhead = seededNoise({ length: 70_000, rms: 0.1, seed: 2 });

describe('the two microphones added', () => {
  it('are the kick and the overhead flipped, earlier and louder, without a seam', async () => {
    const choice = { flipped: true, shiftMs: 1.637, gainDb: 5.7 };
    const added = await whole(addedTrack(await track(kick), await track(overhead), choice));
    const shifted = shiftedSamples(overhead, 1.637 * 48);
    const gain = -(10 ** (5.7 / 20));
    // Float32 sums of numbers below 4.
    added.forEach((sample, i) => expect(Math.abs(sample - (kick[i] + gain * shifted[i]))).toBeLessThan(1e-6));
    expect(added).toHaveLength(70_000);
  });

  it('are plainly the sum as recorded', async () => {
    const plain = addedTrack(await track(kick), await track(overhead), {
      flipped: false,
      shiftMs: 0,
      gainDb: 0,
    });
    const sum = kick.map((sample, i) => sample + overhead[i]);
    expect([...(await plain.read(65_000, 66_000))]).toEqual([...sum.subarray(65_000, 66_000)]);
  });

  it('cancel wholly where one is the other flipped', async () => {
    const flipped = addedTrack(await track(kick), await track(kick), {
      flipped: true,
      shiftMs: 0,
      gainDb: 0,
    });
    expect((await whole(flipped)).every((sample) => sample === 0)).toBe(true);
  });

  it('last as long as the longer of the two', async () => {
    const short = await track(overhead.subarray(0, 10));
    const added = addedTrack(await track(kick.subarray(0, 20)), short, {
      flipped: false,
      shiftMs: 0,
      gainDb: 0,
    });
    expect((await whole(added)).slice(10)).toEqual([...kick.subarray(10, 20)]);
  });

  it('refuse two rates and a choice that is no number', async () => {
    const choice = { flipped: false, shiftMs: 0, gainDb: 0 };
    const [a, b] = [await track(kick), await track(overhead, 44100)];
    expect(() => addedTrack(a, b, choice)).toThrow('one sample rate');
    expect(() => addedTrack(a, a, { ...choice, shiftMs: NaN })).toThrow('finite shift');
    expect(() => addedTrack(a, a, { ...choice, gainDb: Infinity })).toThrow('finite');
  });
});
