import { Readable } from 'node:stream';
import { finished } from 'node:stream/promises';
import { ZipFile } from 'yazl';

/** One file of an archive. */
export interface ZipEntry {
  /** With slashes, relative. */
  path: string;
  modifiedAt?: Date;
  /** False for sound and pictures, which hardly get smaller. */
  compress?: boolean;
  /** Called when it is this file's turn, not before. */
  open: () => Promise<Readable>;
}

/**
 * An archive that is written while it is read: one file after the other, each asked for when the one before is through,
 * so that it may be larger than memory. An entry that can't be read destroys the stream with its error.
 */
export function zipStream(entries: AsyncIterable<ZipEntry>): Readable {
  const zip = new ZipFile();
  const archive = zip.outputStream as Readable;
  const closed = new AbortController();
  archive.once('close', () => closed.abort());
  zip.on('error', (error: Error) => archive.destroy(error));
  fill(zip, entries, closed.signal).catch((error: unknown) => archive.destroy(error as Error));
  return archive;
}

async function fill(zip: ZipFile, entries: AsyncIterable<ZipEntry>, closed: AbortSignal): Promise<void> {
  for await (const { path, modifiedAt, compress = true, open } of entries) {
    if (closed.aborted) return;
    const bytes = await open();
    try {
      zip.addReadStream(bytes, path, { mtime: modifiedAt, compress });
      await finished(bytes, { signal: closed });
    } finally {
      bytes.destroy();
    }
  }
  zip.end();
}

/** @returns a file of an archive that is small enough to be made whole */
export const textEntry = (path: string, text: string): ZipEntry => ({
  path,
  open: () => Promise.resolve(Readable.from([Buffer.from(text)])),
});

export const jsonEntry = (path: string, value: unknown): ZipEntry =>
  textEntry(path, `${JSON.stringify(value, null, 2)}\n`);
