import { createHash } from 'node:crypto';
import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { ExcerptRequest } from '@thudline/contracts';
import { openWav, TrackSource } from '@thudline/dsp';
import { validate } from 'uuid';
import { notFound } from '../errors/app-error';
import { ObjectSource } from '../storage/object-source';
import { ObjectStoreService } from '../storage/object-store.service';
import { TakeFile } from '../takes/entities/take-file.entity';
import { TakeTrack } from '../takes/entities/take-track.entity';
import { blockFrames, ListenWav } from './listen-wav';

export interface Excerpt {
  sampleRateHz: number;
  startFrame: number;
  frames: number;
  trackCount: number;
  bytes: Buffer;
}

/** Reads the recordings of a take from the object store, only as much as is asked for. */
@Injectable()
export class TakeSoundService {
  constructor(
    private readonly em: EntityManager,
    private readonly objects: ObjectStoreService,
  ) {}

  async excerpt(takeId: string, { startS, durationS }: ExcerptRequest): Promise<Excerpt> {
    const tracks = await this.openTracks(await this.tracksOf(takeId));
    const sampleRateHz = tracks[0]?.sampleRateHz ?? 0;
    const lastFrame = Math.min(...tracks.map((track) => track.frames));
    const startFrame = Math.min(Math.round(startS * sampleRateHz), lastFrame);
    const endFrame = Math.min(startFrame + Math.round(durationS * sampleRateHz), lastFrame);
    const frames = endFrame - startFrame;
    const bytes = Buffer.alloc(tracks.length * frames * 4);
    for (let first = startFrame; first < endFrame; first += blockFrames) {
      const end = Math.min(first + blockFrames, endFrame);
      // Tracks of one file share the block that was read last, so they are read one after the other.
      for (const [position, track] of tracks.entries())
        writeSamples(bytes, await track.read(first, end), position * frames + first - startFrame);
    }
    return { sampleRateHz, startFrame, frames, trackCount: tracks.length, bytes };
  }

  async listenWav(takeId: string): Promise<{ wav: ListenWav; etag: string }> {
    const tracks = await this.tracksOf(takeId);
    const heard = tracks.map((track) => `${track.file.unwrap().sha256}:${track.channel}`).join();
    const etag = `"${createHash('sha256').update(heard).digest('hex').slice(0, 32)}"`;
    return { wav: new ListenWav(await this.openTracks(tracks)), etag };
  }

  async getFile(takeId: string, fileId: string): Promise<TakeFile> {
    const file = validate(fileId) ? await this.em.findOne(TakeFile, { id: fileId, take: takeId }) : null;
    if (!file) throw notFound();
    return file;
  }

  private tracksOf(takeId: string): Promise<TakeTrack[]> {
    return this.em.find(TakeTrack, { take: takeId }, { orderBy: { position: 'asc' }, populate: ['file'] });
  }

  private async openTracks(tracks: TakeTrack[]): Promise<TrackSource[]> {
    const files = new Map(tracks.map((track) => [track.file.id, track.file.unwrap()]));
    const opened = new Map(
      await Promise.all(
        [...files].map(async ([id, file]) => {
          const source = new ObjectSource(this.objects, file.objectKey, file.bytes);
          return [id, await openWav(source)] as const;
        }),
      ),
    );
    return tracks.flatMap(({ file, channel }) => opened.get(file.id)?.track(channel) ?? []);
  }
}

function writeSamples(bytes: Buffer, samples: Float32Array, at: number): void {
  samples.forEach((sample, index) => bytes.writeFloatLE(sample, (at + index) * 4));
}
