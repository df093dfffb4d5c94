import { createHash } from 'node:crypto';
import { createWriteStream } from 'node:fs';
import { join } from 'node:path';
import { Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import { NoSuchKey } from '@aws-sdk/client-s3';
import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { MeasureJob } from '@thudline/measure';
import { AppError } from '../errors/app-error';
import { ObjectStoreService } from '../storage/object-store.service';
import { TakeFile } from '../takes/entities/take-file.entity';
import { TakeTrack } from '../takes/entities/take-track.entity';

interface FetchOptions {
  takeId: string;
  folder: string;
  signal: AbortSignal;
}

/** The stored bytes are gone, or aren't those that were uploaded: nothing is measured from them. */
export class StoredBytesDiffer extends Error {}

/** Copies the recordings of a take from the object store to scratch. */
@Injectable()
export class TakeFetcher {
  constructor(
    private readonly em: EntityManager,
    private readonly objects: ObjectStoreService,
  ) {}

  async fetch({ takeId, folder, signal }: FetchOptions): Promise<Pick<MeasureJob, 'paths' | 'tracks'>> {
    const em = this.em.fork();
    const files = await em.find(TakeFile, { take: takeId }, { orderBy: { position: 'asc' } });
    const tracks = await em.find(TakeTrack, { take: takeId }, { orderBy: { position: 'asc' } });
    const paths: string[] = [];
    for (const file of files) paths.push(await this.copy(file, folder, signal));
    return {
      paths,
      tracks: tracks.map(({ role, channel, file }) => ({
        role,
        channel,
        fileIndex: files.findIndex((candidate) => candidate.id === file.id),
      })),
    };
  }

  private async copy(file: TakeFile, folder: string, signal: AbortSignal): Promise<string> {
    const path = join(folder, `${file.id}.wav`);
    const hash = createHash('sha256');
    async function* hashed(chunks: AsyncIterable<Buffer>) {
      for await (const chunk of chunks) {
        hash.update(chunk);
        yield chunk;
      }
    }
    await pipeline(await this.stored(file), hashed, createWriteStream(path), { signal });
    if (hash.digest('hex') !== file.sha256) throw new StoredBytesDiffer(`${file.objectKey} has other bytes`);
    return path;
  }

  private async stored(file: TakeFile): Promise<Readable> {
    try {
      return await this.objects.stream(file.objectKey);
    } catch (error) {
      // A store that doesn't answer is waited for; one that answers and has nothing never will have.
      if (error instanceof AppError && error.cause instanceof NoSuchKey)
        throw new StoredBytesDiffer(`${file.objectKey} is gone`);
      throw error;
    }
  }
}
