import { decode } from 'wav-decoder';
import { bytesSource } from './bytesSource';
import { encodeWav } from './encodeWav';
import { openWav } from './openWav';
import { chunk, fmt, pcmGuid, riff } from './testing/handMadeWav';

const int16 = (...values: number[]) => new Uint8Array(Int16Array.from(values).buffer);
const open = (bytes: Uint8Array) => openWav(bytesSource(bytes));

async function samples(bytes: Uint8Array, channel = 0): Promise<number[]> {
  const all: number[] = [];
  for await (const block of (await open(bytes)).track(channel).blocks()) all.push(...block);
  return all;
}

describe('openWav', () => {
  it('says what a plain 24-bit file holds', async () => {
    const bytes = encodeWav({
      channels: [new Float32Array(480), new Float32Array(480)],
      sampleRateHz: 48000,
      bitDepth: 24,
    });
    expect((await open(bytes)).facts).toEqual({
      encoding: 'pcm',
      bitsPerSample: 24,
      validBits: 24,
      channels: 2,
      sampleRateHz: 48000,
      frames: 480,
      dataOffset: 44,
      blockAlign: 6,
      cutShort: false,
      durationS: 0.01,
      encodingName: '24-bit PCM',
      broadcast: null,
    });
  });

  it('divides N-bit integers by 2^(N-1) and reads 8-bit unsigned', async () => {
    const cases: [number, number[], number[]][] = [
      [8, [0, 64, 128, 255], [-1, -0.5, 0, 127 / 128]],
      [16, [0x00, 0x80, 0xff, 0x7f], [-1, 32767 / 32768]],
      [24, [0, 0, 0x80, 1, 0, 0, 0xff, 0xff, 0x7f], [-1, 2 ** -23, 1 - 2 ** -23]],
      [32, [0, 0, 0, 0x80, 0, 0, 0, 0x40], [-1, 0.5]],
    ];
    for (const [bits, raw, expected] of cases) {
      expect(await samples(riff([fmt({ bits }), chunk('data', Uint8Array.from(raw))]))).toEqual(expected);
    }
  });

  it('agrees with wav-decoder wherever that decodes rightly', async () => {
    const random = pseudoRandomBytes(4 * 3 * 500);
    const kinds = [
      { bits: 16, tag: 1 },
      { bits: 24, tag: 1 },
      { bits: 32, tag: 1 },
      { bits: 32, tag: 3 },
    ];
    for (const { bits, tag } of kinds) {
      const data =
        tag === 3
          ? new Uint8Array(Float32Array.from(random.slice(0, 1500), (byte) => byte / 100 - 1).buffer)
          : random;
      const bytes = riff([
        fmt({ bits, tag, channels: 3 }),
        chunk('data', data.subarray(0, (bits / 8) * 3 * 500)),
      ]);
      const reference = await decode(bytes.buffer.slice(0), { symmetric: true });
      for (let channel = 0; channel < 3; channel++) {
        expect(await samples(bytes, channel)).toEqual([...reference.channelData[channel]]);
      }
    }
  });

  it('keeps overs of float files and reads what is no number as 0', async () => {
    const data = new Uint8Array(Float64Array.of(1.5, -2, NaN, Infinity, 1e300, 0.25).buffer);
    expect(await samples(riff([fmt({ bits: 64, tag: 3 }), chunk('data', data)]))).toEqual([
      1.5, -2, 0, 0, 0, 0.25,
    ]);
  });

  it('reads extensible files and tells valid bits from the container', async () => {
    const format = fmt({ bits: 32, extensible: { validBits: 27, guid: pcmGuid } });
    const file = await open(riff([format, chunk('data', new Uint8Array([0, 0, 0, 0xc0]))]));
    expect(file.facts).toMatchObject({ bitsPerSample: 32, validBits: 27, encodingName: '27-bit PCM' });
    expect(file.track(0).quantisationStep).toBe(2 ** -26);
    expect([...(await file.track(0).read(0, 1))]).toEqual([-0.5]);
  });

  it('skips unknown chunks and reads chunks in any order', async () => {
    const data = chunk('data', int16(16384, -16384));
    const odd = chunk('zzzz', new Uint8Array(3));
    expect(await samples(riff([odd, data, odd, fmt({})]))).toEqual([0.5, -0.5]);
    expect(await samples(riff([chunk('JUNK', new Uint8Array(28)), fmt({}), odd, data, odd]))).toEqual([
      0.5, -0.5,
    ]);
  });

  it('finds the next chunk where the pad byte of an odd chunk is missing', async () => {
    const odd = chunk('LIST', new Uint8Array(5).fill(65), { pad: false });
    expect(await samples(riff([fmt({}), odd, chunk('data', int16(8192))]))).toEqual([0.25]);
  });

  it('clamps a data size of 0, 0xFFFFFFFF or beyond the file to what is there, and says so', async () => {
    for (const declaredBytes of [0, 0xffffffff, 5000]) {
      const bytes = riff([fmt({}), chunk('data', int16(1, 2, 3), { declaredBytes })]);
      expect((await open(bytes)).facts).toMatchObject({ frames: 3, cutShort: true });
    }
  });

  it('takes the size of RF64 and BW64 sound from ds64, and leaves trailing chunks alone', async () => {
    const ds64 = new DataView(new ArrayBuffer(28));
    ds64.setBigUint64(8, 4n, true);
    for (const container of ['RF64', 'BW64']) {
      const data = chunk('data', int16(8192, 4096), { declaredBytes: 0xffffffff });
      const file = riff(
        [chunk('ds64', new Uint8Array(ds64.buffer)), fmt({}), data, chunk('LIST', new Uint8Array(40))],
        container,
      );
      expect((await open(file)).facts).toMatchObject({ frames: 2, cutShort: false });
    }
  });

  it('reads any stretch, with zeros outside the file', async () => {
    const track = (await open(riff([fmt({}), chunk('data', int16(8192, 16384))]))).track(0);
    expect([...(await track.read(-2, 4))]).toEqual([0, 0, 0.25, 0.5, 0, 0]);
    expect([...(await track.read(1, 2))]).toEqual([0.5]);
    expect((await track.read(9, 12)).every((x) => x === 0)).toBe(true);
    expect((await track.read(3, 3)).length).toBe(0);
  });

  it('gives all channels in blocks of bounded size', async () => {
    const left = Float32Array.from({ length: 100_001 }, (_, i) => (i % 1000) / 1024);
    const right = left.map((x) => -x);
    const file = await open(encodeWav({ channels: [left, right], sampleRateHz: 44100, bitDepth: 'float32' }));
    let frames = 0;
    for await (const [a, b] of file.blocks()) {
      expect(a.length).toBeLessThanOrEqual(32_768);
      expect([a[0], b[a.length - 1]]).toEqual([left[frames], right[frames + a.length - 1]]);
      frames += a.length;
    }
    expect(frames).toBe(100_001);
  });

  it('never asks the source for the whole of a long file', async () => {
    const bytes = encodeWav({ channels: [new Float32Array(1_000_000)], sampleRateHz: 48000, bitDepth: 24 });
    let largest = 0;
    const source = bytesSource(bytes);
    const file = await openWav({
      sizeBytes: source.sizeBytes,
      read: (start, end) => {
        largest = Math.max(largest, end - start);
        return source.read(start, end);
      },
    });
    let frames = 0;
    for await (const block of file.track(0).blocks()) frames += block.length;
    expect(frames).toBe(1_000_000);
    expect(largest).toBeLessThanOrEqual(256 * 1024);
  });

  it('tells of a file that became shorter while it was read', async () => {
    const bytes = encodeWav({ channels: [new Float32Array(1000)], sampleRateHz: 48000, bitDepth: 16 });
    const file = await openWav({
      sizeBytes: bytes.length,
      read: (start, end) => Promise.resolve(bytes.subarray(start, Math.min(end, 500))),
    });
    const read = async () => {
      for await (const block of file.track(0).blocks()) expect(block.length).toBe(1000);
    };
    await expect(read()).rejects.toMatchObject({ code: 'cut-off' });
  });

  it('refuses a channel that is not in the file', async () => {
    const file = await open(riff([fmt({}), chunk('data', int16(1))]));
    expect(() => file.track(1)).toThrow('no channel 1 in a file of 1');
  });
});

function pseudoRandomBytes(length: number): Uint8Array {
  let state = 12345;
  return Uint8Array.from({ length }, () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    return state >>> 24;
  });
}
