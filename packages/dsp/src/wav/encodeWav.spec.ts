import { bytesSource } from './bytesSource';
import { encodeFrames, encodeWav } from './encodeWav';
import { openWav } from './openWav';
import { wavHeader, type WavBitDepth } from './wavHeader';

async function roundTrip(channels: Float32Array[], bitDepth: WavBitDepth): Promise<number[][]> {
  const file = await openWav(bytesSource(encodeWav({ channels, sampleRateHz: 48000, bitDepth })));
  return Promise.all(channels.map(async (_, i) => [...(await file.track(i).read(0, file.facts.frames))]));
}

describe('encodeWav', () => {
  it('gives back every 16-bit and 24-bit value it was given', async () => {
    const all16 = Float32Array.from({ length: 65536 }, (_, i) => (i - 32768) / 32768);
    expect(await roundTrip([all16], 16)).toEqual([[...all16]]);
    const some24 = Float32Array.from({ length: 20_000 }, (_, i) => ((i - 10_000) * 838 + (i % 2)) / 8388608);
    expect(await roundTrip([some24, some24.map((x) => 0 - x)], 24)).toEqual([
      [...some24],
      [...some24.map((x) => 0 - x)],
    ]);
  });

  it('rounds to the nearest step and clamps at full scale', async () => {
    const step = 1 / 32768;
    const [samples] = await roundTrip(
      [Float32Array.of(0.4 * step, 0.6 * step, -0.6 * step, 0.5 * step, -0.5 * step, 1, 1.7, -1, -1.7)],
      16,
    );
    expect(samples.map((x) => x / step)).toEqual([0, 1, -1, 1, -1, 32767, 32767, -32768, -32768]);
  });

  it('keeps float samples as they are, overs too', async () => {
    const samples = Float32Array.of(0.1, -1.5, 3e-9);
    expect(await roundTrip([samples], 'float32')).toEqual([[...samples]]);
  });

  it('writes a 44-byte header for integers and pads an odd number of bytes', () => {
    const file = encodeWav({ channels: [Float32Array.of(0)], sampleRateHz: 44100, bitDepth: 24 });
    // As SoX writes it: 5 bytes of sound make a RIFF size of 42; 3 bytes, 40.
    expect(file.length).toBe(48);
    expect(new DataView(file.buffer).getUint32(4, true)).toBe(40);
    expect(new DataView(file.buffer).getUint32(40, true)).toBe(3);
  });

  it('writes in pieces what it writes at once', () => {
    const samples = Float32Array.from({ length: 10 }, (_, i) => i / 16);
    const whole = encodeWav({ channels: [samples], sampleRateHz: 8000, bitDepth: 16 });
    const header = wavHeader({ channels: 1, sampleRateHz: 8000, bitDepth: 16, frames: 10 });
    const pieces = [samples.subarray(0, 3), samples.subarray(3)].map((part) => encodeFrames([part], 16));
    expect([...header, ...pieces[0], ...pieces[1]]).toEqual([...whole]);
  });

  it('refuses unequal channels, no channel, no numbers and more than a header can say', () => {
    const options = { sampleRateHz: 48000, bitDepth: 16 } as const;
    expect(() => encodeWav({ ...options, channels: [new Float32Array(2), new Float32Array(3)] })).toThrow(
      'equally long',
    );
    expect(() => encodeWav({ ...options, channels: [] })).toThrow('needs a channel');
    expect(() => encodeWav({ ...options, channels: [Float32Array.of(NaN)] })).toThrow('not a finite number');
    expect(() => wavHeader({ ...options, channels: 2, frames: 2 ** 31 })).toThrow('size of the file');
  });

  it('leaves its input as it was', () => {
    const samples = Float32Array.of(2, -2, 0.3);
    encodeWav({ channels: [samples], sampleRateHz: 48000, bitDepth: 24 });
    expect([...samples]).toEqual([...Float32Array.of(2, -2, 0.3)]);
  });
});
