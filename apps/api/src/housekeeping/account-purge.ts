import { EntityManager, LockMode } from '@mikro-orm/postgresql';
import { Injectable, Logger } from '@nestjs/common';
import { AuditEvent } from '../audit/entities/audit-event.entity';
import { Export } from '../exports/entities/export.entity';
import { Measurement } from '../measuring/entities/measurement.entity';
import { Photo } from '../photos/entities/photo.entity';
import { Setting } from '../settings/entities/setting.entity';
import { objectKeys } from '../storage/object-keys';
import { ObjectStoreService } from '../storage/object-store.service';
import { Take } from '../takes/entities/take.entity';
import { User } from '../users/entities/user.entity';

/** Longer than any request lasts: since the account closed nothing new can have come. */
const marginMs = 60 * 60 * 1000;
/** Taken per run; the next run takes the next ones. */
const mostAtOnce = 20;

/** Removes accounts for good whose days of grace are over: every object, then every row. */
@Injectable()
export class AccountPurge {
  private readonly logger = new Logger('Purge');

  constructor(
    private readonly em: EntityManager,
    private readonly objects: ObjectStoreService,
  ) {}

  /** Rows go only after the objects, so that what could not be removed now is found by the next run. */
  async run(now: Date): Promise<void> {
    const over = await this.em
      .fork()
      .find(
        User,
        { deleteAfter: { $lt: new Date(now.getTime() - marginMs) } },
        { orderBy: { deleteAfter: 'asc' }, limit: mostAtOnce },
      );
    for (const { id } of over) {
      try {
        await this.removeWork(id);
        await this.removeObjects(id);
        await this.removeRows(id);
      } catch (error) {
        this.logger.warn(error, `Account ${id} could not be removed; the next run tries again`);
      }
    }
  }

  /** What is being made notices within a heartbeat, and stores nothing more. */
  private async removeWork(ownerId: string): Promise<void> {
    const em = this.em.fork();
    const underway = { state: { $in: ['queued', 'running'] as const } };
    await em.nativeUpdate(Measurement, { take: { owner: ownerId }, ...underway }, { state: 'cancelled' });
    await em.nativeUpdate(Export, { owner: ownerId, ...underway }, { state: 'failed' });
  }

  private async removeObjects(ownerId: string): Promise<void> {
    const em = this.em.fork();
    for (const { id } of await em.find(Take, { owner: ownerId }, { fields: ['id'] }))
      await this.objects.removeAll(objectKeys.take(id));
    for (const { objectKey } of await em.find(Photo, { owner: ownerId }))
      await this.objects.removeAll(objectKey);
    await this.objects.removeAll(objectKeys.exports(ownerId));
  }

  /** Tables that point at a person go along with the row; the others are named here. */
  private async removeRows(ownerId: string): Promise<void> {
    await this.em.fork().transactional(async (em) => {
      const user = await em.findOne(User, { id: ownerId }, { lockMode: LockMode.PESSIMISTIC_WRITE });
      if (!user) return;
      const takes = await em.find(Take, { owner: ownerId }, { fields: ['id'] });
      await em.nativeDelete(Setting, { key: 'sample-take', value: { $in: takes.map(({ id }) => id) } });
      await em.nativeDelete(AuditEvent, { userId: ownerId });
      await em.nativeUpdate(AuditEvent, { subjectId: ownerId }, { subjectId: null });
      await em.execute('delete from throttle where key like ?', [`%${ownerId}%`]);
      await em.execute('delete from pgboss.job where data::text like ?', [`%${ownerId}%`]);
      await em.nativeDelete(User, { id: ownerId });
      em.create(AuditEvent, { kind: 'account-deleted', userId: null, subjectId: null, address: null });
    });
  }
}
