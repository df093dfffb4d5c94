import { createHash } from 'node:crypto';
import { createWriteStream } from 'node:fs';
import { join } from 'node:path';
import { pipeline } from 'node:stream/promises';
import { Request } from 'express';
import { StorageEngine } from 'multer';

/** What a received file is called on the client and what it is on our disk. */
export interface ReceivedFile {
  name: string;
  path: string;
  bytes: number;
  sha256: string;
}

/** Multer engine: streams files into one folder under names of ours, hashing on the way. */
export class ScratchStorage implements StorageEngine {
  private received = 0;

  constructor(private readonly folder: string) {}

  _handleFile(
    _request: Request,
    file: Express.Multer.File,
    done: (error?: unknown, info?: object) => void,
  ): void {
    const path = join(this.folder, `${this.received++}.wav`);
    this.write(file.stream, path).then(
      (written) => done(null, { path, ...written }),
      (error: unknown) => done(error),
    );
  }

  /** The whole folder goes when the upload is over. */
  _removeFile(_request: Request, _file: Express.Multer.File, done: (error: Error | null) => void): void {
    done(null);
  }

  private async write(
    stream: NodeJS.ReadableStream,
    path: string,
  ): Promise<{ bytes: number; sha256: string }> {
    const hash = createHash('sha256');
    let bytes = 0;
    async function* counted(chunks: AsyncIterable<Buffer>) {
      for await (const chunk of chunks) {
        hash.update(chunk);
        bytes += chunk.length;
        yield chunk;
      }
    }
    await pipeline(stream as AsyncIterable<Buffer>, counted, createWriteStream(path));
    return { bytes, sha256: hash.digest('hex') };
  }
}
