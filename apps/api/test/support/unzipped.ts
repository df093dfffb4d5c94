import { buffer } from 'node:stream/consumers';
import { Entry, fromBuffer, ZipFile } from 'yauzl';

/** @returns what an archive holds, by path, in its order; every checksum is looked at */
export async function unzipped(archive: Buffer): Promise<Map<string, Buffer>> {
  const zip = await opened(archive);
  const files = new Map<string, Buffer>();
  return new Promise((resolve, reject) => {
    zip.on('error', reject);
    zip.on('end', () => resolve(files));
    zip.on('entry', (entry: Entry) => {
      read(zip, entry).then((bytes) => {
        files.set(entry.fileName, bytes);
        zip.readEntry();
      }, reject);
    });
    zip.readEntry();
  });
}

const opened = (archive: Buffer) =>
  new Promise<ZipFile>((resolve, reject) => {
    fromBuffer(archive, { lazyEntries: true }, (error, zip) => (error ? reject(error) : resolve(zip)));
  });

const read = (zip: ZipFile, entry: Entry) =>
  new Promise<Buffer>((resolve, reject) => {
    zip.openReadStream(entry, (error, stream) => (error ? reject(error) : resolve(buffer(stream))));
  });
