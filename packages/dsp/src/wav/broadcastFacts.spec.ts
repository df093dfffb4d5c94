import { bytesSource } from './bytesSource';
import { openWav } from './openWav';
import { broadcastChunk } from './testing/broadcastChunk';
import { chunk, fmt, riff } from './testing/handMadeWav';

const sound = chunk('data', new Uint8Array(8));
const read = async (chunks: Uint8Array[]) => (await openWav(bytesSource(riff(chunks)))).facts.broadcast;
const broadcast = (...fields: Parameters<typeof broadcastChunk>) =>
  read([broadcastChunk(...fields), fmt({}), sound]);

const written = {
  description: 'Take 4, overhead lower',
  originator: 'Field recorder',
  date: '2026-11-30',
  time: '18:05:09',
  // EBU Tech 3285 2.3: 13:30:00 at 96 kHz needs more than 32 bits.
  timeReference: 4_665_600_000n,
};

describe('what the recorder wrote into a file', () => {
  it('is read before the sound and behind it', async () => {
    const expected = { ...written, timeReference: undefined, timeReferenceSamples: 4_665_600_000 };
    expect(await broadcast(written)).toEqual(expected);
    const odd = chunk('LIST', new Uint8Array(7));
    expect(await read([fmt({}), sound, odd, broadcastChunk(written)])).toEqual(expected);
  });

  it('is null where there is no such chunk, or an empty one', async () => {
    expect(await read([fmt({}), sound])).toBeNull();
    expect(await broadcast({})).toBeNull();
    expect(await broadcast({ description: '\r\n \x7f', date: '0000-00-00', time: '00:00:00' })).toBeNull();
    expect(await broadcast({}, { bodyBytes: 0 })).toBeNull();
  });

  it('ends at the first zero and where the field ends', async () => {
    expect(await broadcast({ description: 'one\0two' })).toMatchObject({ description: 'one' });
    const full = await broadcast({ description: 'x'.repeat(256), originator: 'y'.repeat(32) });
    expect([full?.description?.length, full?.originator?.length]).toEqual([256, 32]);
  });

  it('is cleaned of control characters and of marks that turn its direction', async () => {
    const utf8 = String.fromCharCode(...new TextEncoder().encode('a\u202eb\u2028c\u200bd'));
    expect(await broadcast({ description: ' kick\r\nin\x1b[31m\x85red ' })).toMatchObject({
      description: 'kick in [31m red',
    });
    expect(await broadcast({ description: utf8 })).toMatchObject({ description: 'a b c d' });
  });

  it('is read as UTF-8 where it is that, else as Latin-1', async () => {
    const utf8 = String.fromCharCode(...new TextEncoder().encode(`${'x'.repeat(255)}é`));
    expect(await broadcast({ description: 'Tr\xc3\xb6te' })).toMatchObject({ description: 'Tröte' });
    expect(await broadcast({ description: 'Tr\xf6te' })).toMatchObject({ description: 'Tröte' });
    // The last character is cut in the middle.
    expect(await broadcast({ description: utf8.slice(0, 256) })).toMatchObject({
      description: 'x'.repeat(255),
    });
  });

  it.each([
    ['2026:02:28', '23-59-59', '2026-02-28', '23:59:59'],
    ['2024/02/29', '00.00.00', '2024-02-29', '00:00:00'],
    ['2026-02-29', '24:00:00', null, null],
    ['2026-13-01', '12:60:00', null, null],
    ['0000-01-01', '12:00', null, null],
    ['Tuesday', 'noon', null, null],
  ])('takes the date %s and the time %s as %s and %s', async (date, time, expectedDate, expectedTime) => {
    const facts = await broadcast({ description: 'x', date, time });
    expect(facts).toMatchObject({ date: expectedDate, time: expectedTime });
  });

  it('leaves out what a short or nonsensical chunk can’t say', async () => {
    const short = await broadcast(written, { bodyBytes: 300 });
    expect(short).toMatchObject({ originator: 'Field recorder', date: null, timeReferenceSamples: null });
    expect(await broadcast({ ...written, timeReference: 2n ** 63n })).toMatchObject({
      timeReferenceSamples: null,
    });
  });
});
