import { broadcastChunk, infoChunk } from './aboutChunks';
import { bytesSource } from './bytesSource';
import { encodeWav } from './encodeWav';
import { openWav } from './openWav';

const sound = { channels: [Float32Array.of(0.5, -0.25, 0.125)], sampleRateHz: 48000, bitDepth: 24 } as const;
const ascii = (bytes: Uint8Array) => String.fromCharCode(...bytes);

describe('chunks that tell about a file', () => {
  it('come back as they were written, and leave the sound alone', async () => {
    const about = { description: 'Kick and overhead added', originator: 'Thudline', date: '2026-12-01' };
    const chunks = [
      broadcastChunk({
        ...about,
        time: '12:00:01',
        timeReferenceSamples: 4_665_600_000,
        codingHistory: 'A=PCM',
      }),
      infoChunk({ name: 'Take 4', comment: 'Overhead flipped.' }),
    ];
    const file = await openWav(bytesSource(encodeWav({ ...sound, chunks })));
    expect(file.facts.broadcast).toEqual({
      ...about,
      time: '12:00:01',
      timeReferenceSamples: 4_665_600_000,
    });
    expect([...(await file.track(0).read(0, 3))]).toEqual([...sound.channels[0]]);
  });

  it('lie where EBU Tech 3285 v2 puts them', () => {
    // EBU Tech 3285 2.3: version at 346, unused loudness 7FFFh at 412, coding history from 602; 8 for id and size.
    const chunk = broadcastChunk({ codingHistory: 'A=PCM,F=48000' });
    const view = new DataView(chunk.buffer);
    expect([view.getUint32(4, true), view.getUint16(8 + 346, true), view.getUint16(8 + 412, true)]).toEqual([
      617, 2, 0x7fff,
    ]);
    expect(ascii(chunk.subarray(8 + 602))).toBe('A=PCM,F=48000\r\n\0');
  });

  it('are a list of texts that end with a zero, each of an even length', () => {
    expect(ascii(infoChunk({ name: 'ab', comment: 'c' }))).toBe(
      'LIST\x1a\0\0\0INFOINAM\x03\0\0\0ab\0\0ICMT\x02\0\0\0c\0',
    );
  });

  it('cut what is too long, and write letters and marks in ASCII', async () => {
    const chunks = [broadcastChunk({ description: 'ü'.repeat(300), originator: '“Größe” – ドラム −1' })];
    const { facts } = await openWav(bytesSource(encodeWav({ ...sound, chunks })));
    expect(facts.broadcast).toMatchObject({ description: 'u'.repeat(256), originator: '"Gro?e" - ??? -1' });
    // An accent that is taken away shortens the text, and with it the chunk.
    expect(ascii(infoChunk({ name: 'é' }))).toBe('LIST\x0e\0\0\0INFOINAM\x02\0\0\0e\0');
  });
});
