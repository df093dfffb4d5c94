import { createHash } from 'node:crypto';
import { createReadStream } from 'node:fs';
import { PassThrough, Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import {
  DeleteObjectCommand,
  DeleteObjectsCommand,
  GetObjectCommand,
  HeadBucketCommand,
  HeadObjectCommand,
  ListObjectsV2Command,
  NoSuchKey,
  NotFound,
  PutObjectCommand,
  S3Client,
} from '@aws-sdk/client-s3';
import { Upload } from '@aws-sdk/lib-storage';
import { Inject, Injectable, Logger, OnApplicationShutdown } from '@nestjs/common';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { AppError } from '../errors/app-error';
import { createS3Client } from './s3-client';

export interface StoredStream {
  bytes: number;
  sha256: string;
}

/** At 10,000 parts, the most there may be, an object has 80 GB. */
const partSize = 8 * 1024 * 1024;

interface StoredFile {
  key: string;
  path: string;
  bytes: number;
  sha256: string;
}

interface StoredObject {
  key: string;
  storedAt: Date;
}

/** Where the bytes of recordings are kept. Every failure of the service is `storage-unavailable`. */
@Injectable()
export class ObjectStoreService implements OnApplicationShutdown {
  private readonly logger = new Logger(ObjectStoreService.name);
  private readonly client: S3Client;
  private readonly bucket: string;

  constructor(@Inject(CONFIG) config: Config) {
    this.client = createS3Client(config.objectStore);
    this.bucket = config.objectStore.bucket;
  }

  /** Puts a file and reads it back: what is stored has the file's SHA-256, or this throws. */
  async putVerified({ key, path, bytes, sha256 }: StoredFile): Promise<void> {
    const body = createReadStream(path);
    const put = new PutObjectCommand({
      Bucket: this.bucket,
      Key: key,
      Body: body,
      ContentLength: bytes,
      ContentType: 'audio/wav',
    });
    try {
      await this.answered(() => this.client.send(put));
    } finally {
      // A request that fails leaves the file open.
      body.destroy();
    }
    const hash = createHash('sha256');
    await this.answered(async () => pipeline(await this.body(key), hash));
    if (hash.digest('hex') !== sha256) throw unavailable(new Error(`${key} was stored with other bytes`));
  }

  /**
   * Puts what is written while it is read, in parts, so that it may be larger than memory. Parts of what was broken off
   * are removed.
   *
   * @throws the error of `body` where that breaks
   */
  async putStream(key: string, body: Readable, signal: AbortSignal): Promise<StoredStream> {
    const hash = createHash('sha256');
    let bytes = 0;
    const counted = new PassThrough();
    counted.on('data', (chunk: Buffer) => {
      hash.update(chunk);
      bytes += chunk.length;
    });
    const piped = pipeline(body, counted, { signal });
    const params = { Bucket: this.bucket, Key: key, Body: counted, ContentType: 'application/zip' };
    const upload = new Upload({ client: this.client, params, partSize, queueSize: 2 });
    const [, put] = await Promise.allSettled([piped, this.answered(() => upload.done())]);
    await piped;
    if (put.status === 'rejected') throw put.reason;
    return { bytes, sha256: hash.digest('hex') };
  }

  async put(key: string, bytes: Uint8Array): Promise<void> {
    const put = new PutObjectCommand({
      Bucket: this.bucket,
      Key: key,
      Body: bytes,
      ContentLength: bytes.length,
      ContentType: 'application/octet-stream',
    });
    await this.answered(() => this.client.send(put));
  }

  /** @returns a whole object that is known to be small; null where there is none */
  async readWhole(key: string): Promise<Uint8Array | null> {
    return this.answered(async () => {
      try {
        return Buffer.concat(await (await this.body(key)).toArray());
      } catch (error) {
        if (error instanceof NoSuchKey) return null;
        throw error;
      }
    });
  }

  /** @returns the bytes from `start` to `end` (exclusive) */
  async read(key: string, start: number, end: number): Promise<Uint8Array> {
    if (end <= start) return new Uint8Array(0);
    return this.answered(async () => Buffer.concat(await (await this.body(key, start, end)).toArray()));
  }

  async stream(key: string): Promise<Readable> {
    return this.answered(() => this.body(key));
  }

  /** Best effort: what can't be removed now is logged, and found later as an object without a row. */
  async remove(keys: readonly string[]): Promise<void> {
    if (keys.length === 0) return;
    const objects = keys.map((key) => ({ Key: key }));
    try {
      await this.client.send(new DeleteObjectsCommand({ Bucket: this.bucket, Delete: { Objects: objects } }));
    } catch (error) {
      this.logger.warn({ keys, cause: error }, 'Objects of an upload that failed could not be removed');
    }
  }

  /**
   * Removes every object whose key begins so.
   *
   * @throws where the service doesn't answer, or keeps any
   */
  async removeAll(prefix: string): Promise<void> {
    await this.answered(async () => {
      for (;;) {
        const listed = await this.client.send(
          new ListObjectsV2Command({ Bucket: this.bucket, Prefix: prefix }),
        );
        const keys = (listed.Contents ?? []).flatMap(({ Key }) => Key ?? []);
        if (keys.length === 0) return;
        // One after the other: simple stores stumble over neighbours that go at the same moment.
        for (const key of keys)
          await this.client.send(new DeleteObjectCommand({ Bucket: this.bucket, Key: key }));
      }
    });
  }

  /** Every object there is, in pages of at most a thousand. */
  async *pages(): AsyncGenerator<StoredObject[]> {
    let from: string | undefined;
    do {
      const list = new ListObjectsV2Command({ Bucket: this.bucket, ContinuationToken: from });
      const listed = await this.answered(() => this.client.send(list));
      yield (listed.Contents ?? []).map(({ Key = '', LastModified }) => ({
        key: Key,
        storedAt: LastModified ?? new Date(),
      }));
      from = listed.NextContinuationToken;
    } while (from);
  }

  async has(key: string): Promise<boolean> {
    return this.answered(async () => {
      try {
        await this.client.send(new HeadObjectCommand({ Bucket: this.bucket, Key: key }));
        return true;
      } catch (error) {
        if (error instanceof NotFound || error instanceof NoSuchKey) return false;
        throw error;
      }
    });
  }

  async answers(): Promise<boolean> {
    try {
      await this.client.send(new HeadBucketCommand({ Bucket: this.bucket }), {
        abortSignal: AbortSignal.timeout(3_000),
      });
      return true;
    } catch {
      return false;
    }
  }

  onApplicationShutdown(): void {
    this.client.destroy();
  }

  private async body(key: string, start?: number, end?: number): Promise<Readable> {
    const range = start === undefined || end === undefined ? undefined : `bytes=${start}-${end - 1}`;
    const answer = await this.client.send(
      new GetObjectCommand({ Bucket: this.bucket, Key: key, Range: range }),
    );
    return answer.Body as Readable;
  }

  private async answered<T>(request: () => Promise<T>): Promise<T> {
    try {
      return await request();
    } catch (error) {
      throw error instanceof AppError ? error : unavailable(error);
    }
  }
}

function unavailable(cause: unknown): AppError {
  return new AppError(
    'storage-unavailable',
    'The place where recordings are kept does not answer. Nothing was stored or lost; try again in a minute.',
    { cause },
  );
}
