import fs from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { Config } from '../config/config';
import { ObjectStoreService } from './object-store.service';

/** Nobody listens there: the port is reserved (IANA, tcpmux). */
const endpoint = 'http://127.0.0.1:1';
const bytes = 1024 * 1024;

describe('a file that can’t be stored', () => {
  const folder = fs.mkdtempSync(join(tmpdir(), 'thudline-put-'));
  const path = join(folder, 'kick.wav');

  beforeAll(() => fs.writeFileSync(path, Buffer.alloc(bytes)));
  afterAll(() => fs.rmSync(folder, { recursive: true }));

  it('is closed again', async () => {
    const opened = jest.spyOn(fs, 'createReadStream');
    const objectStore = {
      endpoint,
      region: 'x',
      bucket: 'none',
      accessKey: 'a',
      secretKey: 'b',
      forcePathStyle: true,
    };
    const service = new ObjectStoreService({
      objectStore: { ...objectStore, checksums: 'when-required' },
    } as Config);
    const put = service.putVerified({ key: 'kick.wav', path, bytes, sha256: '' });
    await expect(put).rejects.toMatchObject({ code: 'storage-unavailable' });
    expect(opened.mock.results.map(({ value }) => (value as fs.ReadStream).destroyed)).toEqual([true]);
    service.onApplicationShutdown();
  });
});
