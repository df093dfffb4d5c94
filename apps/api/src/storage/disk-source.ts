import { FileHandle, open } from 'node:fs/promises';
import { ByteSource } from '@thudline/dsp';

/** A file on this machine's disk as a `ByteSource`. */
export class DiskSource implements ByteSource {
  private constructor(
    private readonly file: FileHandle,
    readonly sizeBytes: number,
  ) {}

  static async open(path: string): Promise<DiskSource> {
    const file = await open(path, 'r');
    return new DiskSource(file, (await file.stat()).size);
  }

  async read(start: number, end: number): Promise<Uint8Array> {
    const bytes = new Uint8Array(Math.max(0, Math.min(end, this.sizeBytes) - start));
    const { bytesRead } = await this.file.read(bytes, 0, bytes.length, start);
    return bytes.subarray(0, bytesRead);
  }

  async close(): Promise<void> {
    await this.file.close();
  }
}
