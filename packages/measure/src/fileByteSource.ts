import { readSync } from 'node:fs';
import { open } from 'node:fs/promises';
import type { ByteSource } from '@thudline/dsp';

/** A file on a disk, open until it is closed. */
export interface FileByteSource extends ByteSource {
  close(): Promise<void>;
}

/**
 * Short reads are around hits, of what was just read as a whole: a turn through the thread pool takes longer than they
 * do. Measuring has a thread of its own, which may wait.
 */
const mostAtOnce = 128 * 1024;

/**
 * Opens a file for reads at any place; never holds more of it than what is asked for.
 *
 * @throws the system's error where there is no such file or it may not be read
 */
export async function fileByteSource(path: string): Promise<FileByteSource> {
  const handle = await open(path, 'r');
  const { size: sizeBytes } = await handle.stat();
  return {
    sizeBytes,
    async read(start, end, into) {
      const length = Math.max(0, Math.min(end, sizeBytes) - start);
      const bytes = into && into.length >= length ? into.subarray(0, length) : Buffer.allocUnsafe(length);
      let filled = 0;
      while (filled < bytes.length) {
        const [left, at] = [bytes.length - filled, start + filled];
        const bytesRead =
          bytes.length <= mostAtOnce
            ? readSync(handle.fd, bytes, filled, left, at)
            : (await handle.read(bytes, filled, left, at)).bytesRead;
        if (bytesRead === 0) break;
        filled += bytesRead;
      }
      return bytes.subarray(0, filled);
    },
    close: () => handle.close(),
  };
}
