import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { Export } from '../exports/entities/export.entity';
import { ObjectStoreService } from '../storage/object-store.service';

/** Removes archives that can't be downloaded any more. */
@Injectable()
export class ExportPurge {
  constructor(
    private readonly em: EntityManager,
    private readonly objects: ObjectStoreService,
  ) {}

  async run(now: Date): Promise<void> {
    const em = this.em.fork();
    for (const { id, objectKey } of await em.find(Export, { expiresAt: { $lt: now } })) {
      if (objectKey) await this.objects.removeAll(objectKey);
      await em.nativeDelete(Export, { id });
    }
  }
}
