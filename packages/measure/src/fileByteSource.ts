import { open } from 'node:fs/promises';
import type { ByteSource } from '@thudline/dsp';

/** A file on a disk, open until it is closed. */
export interface FileByteSource extends ByteSource {
  close(): Promise<void>;
}

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
    async read(start, end) {
      const bytes = Buffer.allocUnsafe(Math.max(0, Math.min(end, sizeBytes) - start));
      let filled = 0;
      while (filled < bytes.length) {
        const { bytesRead } = await handle.read(bytes, filled, bytes.length - filled, start + filled);
        if (bytesRead === 0) break;
        filled += bytesRead;
      }
      return bytes.subarray(0, filled);
    },
    close: () => handle.close(),
  };
}
