import { encodeWav, openWav, bytesSource, TrackSource } from '@thudline/dsp';
import { ListenWav } from './listen-wav';

const sampleRateHz = 48_000;
const ramp = (frames: number, step: number) =>
  Float32Array.from({ length: frames }, (_, i) => ((i * step) % 199) / 200);

async function trackOf(samples: Float32Array): Promise<TrackSource> {
  const bytes = encodeWav({ channels: [samples], sampleRateHz, bitDepth: 24 });
  return (await openWav(bytesSource(bytes))).track(0);
}

async function bytesOf(wav: ListenWav, start: number, end: number): Promise<Buffer> {
  const parts: Uint8Array[] = [];
  for await (const part of wav.bytes({ start, end })) parts.push(part);
  return Buffer.concat(parts);
}

describe('ListenWav', () => {
  // More than two blocks, so that their seams are crossed.
  const kick = ramp(70_000, 1);
  const overhead = ramp(70_500, 7);

  it('is the 16-bit file of both tracks, as long as the shorter one', async () => {
    const wav = new ListenWav([await trackOf(kick), await trackOf(overhead)]);
    const whole = encodeWav({ channels: [kick, overhead.slice(0, 70_000)], sampleRateHz, bitDepth: 16 });
    expect(wav.sizeBytes).toBe(whole.length);
    expect((await bytesOf(wav, 0, wav.sizeBytes)).equals(whole)).toBe(true);
  });

  it('gives any stretch as it lies in the whole, in mid-header, mid-frame and over a seam', async () => {
    const wav = new ListenWav([await trackOf(kick), await trackOf(overhead)]);
    const whole = await bytesOf(wav, 0, wav.sizeBytes);
    const seam = 44 + 32_768 * 4;
    for (const [start, end] of [
      [0, 1],
      [3, 44],
      [40, 51],
      [seam - 3, seam + 5],
      [seam, seam + 1],
      [279_999, wav.sizeBytes],
    ]) {
      expect((await bytesOf(wav, start, end)).equals(whole.subarray(start, end))).toBe(true);
    }
  });
});
