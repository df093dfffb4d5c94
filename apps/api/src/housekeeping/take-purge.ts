import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable, Logger } from '@nestjs/common';
import { AuditEvent } from '../audit/entities/audit-event.entity';
import { objectKeys } from '../storage/object-keys';
import { ObjectStoreService } from '../storage/object-store.service';
import { restorableSince } from '../takes/deleted-takes';
import { Take } from '../takes/entities/take.entity';

/** Longer than any request lasts: what is brought back at the last moment is not being removed. */
const marginMs = 60 * 60 * 1000;
/** Taken per run; the next run takes the next ones. */
const mostAtOnce = 100;

/** Removes takes for good that were deleted a while ago: their recordings, then their rows. */
@Injectable()
export class TakePurge {
  private readonly logger = new Logger('Purge');

  constructor(
    private readonly em: EntityManager,
    private readonly objects: ObjectStoreService,
  ) {}

  /** Rows go only after the recordings, so that what could not be removed now is found by the next run. */
  async run(now: Date): Promise<void> {
    const before = new Date(restorableSince(now).getTime() - marginMs);
    const over = await this.em
      .fork()
      .find(Take, { deletedAt: { $lt: before } }, { orderBy: { deletedAt: 'asc' }, limit: mostAtOnce });
    for (const take of over) {
      try {
        await this.objects.removeAll(objectKeys.take(take.id));
        await this.removeRows(take, before);
      } catch (error) {
        this.logger.warn(error, `Take ${take.id} could not be removed; the next run tries again`);
      }
    }
  }

  private async removeRows({ id, owner }: Take, before: Date): Promise<void> {
    await this.em.fork().transactional(async (em) => {
      const removed = await em.nativeDelete(Take, { id, deletedAt: { $lt: before } });
      if (removed > 0)
        em.create(AuditEvent, { kind: 'take-purged', userId: owner.id, subjectId: id, address: null });
    });
  }
}
