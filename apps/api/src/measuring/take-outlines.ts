import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { objectKeys } from '../storage/object-keys';
import { ObjectStoreService } from '../storage/object-store.service';
import { TakeTrack } from '../takes/entities/take-track.entity';
import { Claim } from './measurement-claims';

/** Stores the outlines of a take's tracks, before the report that stands on them is written. */
@Injectable()
export class TakeOutlines {
  constructor(
    private readonly em: EntityManager,
    private readonly objects: ObjectStoreService,
  ) {}

  /** @param peaks - encoded, in the order of the tracks */
  async store(claim: Claim, peaks: readonly Uint8Array[]): Promise<void> {
    const orderBy = { position: 'asc' } as const;
    const tracks = await this.em.fork().find(TakeTrack, { take: claim.takeId }, { orderBy });
    for (const [index, track] of tracks.entries()) {
      const bytes = peaks[index];
      if (bytes) await this.objects.put(objectKeys.peaks(claim, track.id), bytes);
    }
  }
}
