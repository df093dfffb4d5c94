import { once } from 'node:events';
import { Readable } from 'node:stream';
import { unzipped } from '../../test/support/unzipped';
import { jsonEntry, textEntry, ZipEntry, zipStream } from './zip-stream';

async function* given(...entries: ZipEntry[]): AsyncGenerator<ZipEntry> {
  for (const entry of entries) yield await Promise.resolve(entry);
}
const archiveOf = async (...entries: ZipEntry[]) =>
  unzipped(Buffer.concat(await zipStream(given(...entries)).toArray()));

describe('an archive', () => {
  it('holds what was put in, under its name', async () => {
    const noise = Buffer.from(Array.from({ length: 100_000 }, (_, index) => (index * 7919) % 251));
    const files = await archiveOf(
      textEntry('read me.txt', 'Hello, drümmer'),
      jsonEntry('takes/1/take.json', { title: 'Loud' }),
      { path: 'takes/1/kick.wav', compress: false, open: () => Promise.resolve(Readable.from([noise])) },
    );
    expect([...files.keys()]).toEqual(['read me.txt', 'takes/1/take.json', 'takes/1/kick.wav']);
    expect(files.get('read me.txt')?.toString()).toBe('Hello, drümmer');
    expect(JSON.parse(files.get('takes/1/take.json')?.toString() ?? '')).toEqual({ title: 'Loud' });
    expect(files.get('takes/1/kick.wav')?.equals(noise)).toBe(true);
  });

  it('is whole with nothing in it', async () => {
    expect((await archiveOf()).size).toBe(0);
  });

  it('asks for a file only when the one before is through', async () => {
    const opened: string[] = [];
    const slow = new Readable({ read() {} });
    const archive = zipStream(
      given(
        { path: 'a', open: () => Promise.resolve((opened.push('a'), slow)) },
        { path: 'b', open: () => Promise.resolve((opened.push('b'), Readable.from(['b']))) },
      ),
    );
    slow.push('half');
    await once(archive, 'data');
    expect(opened).toEqual(['a']);
    slow.push(null);
    await once(archive, 'end');
    expect(opened).toEqual(['a', 'b']);
  });

  it('breaks off where a file can’t be read, whenever that is', async () => {
    const refused = zipStream(
      given({ path: 'a', open: () => Promise.reject(new Error('The store is away.')) }),
    );
    await expect(refused.toArray()).rejects.toThrow('The store is away.');
    const breaking = new Readable({ read: () => breaking.destroy(new Error('The line was cut.')) });
    const cut = zipStream(given({ path: 'a', open: () => Promise.resolve(breaking) }));
    await expect(cut.toArray()).rejects.toThrow('The line was cut.');
    const outside = zipStream(given(textEntry('../elsewhere', 'x')));
    await expect(outside.toArray()).rejects.toThrow(/relative path/);
  });

  it('lets go of the file it is reading when nobody reads on', async () => {
    const endless = new Readable({ read: () => endless.push(Buffer.alloc(65_536, 7)) });
    const archive = zipStream(given({ path: 'a', compress: false, open: () => Promise.resolve(endless) }));
    await once(archive, 'readable');
    archive.destroy();
    await once(endless, 'close');
    expect(endless.destroyed).toBe(true);
  });
});
