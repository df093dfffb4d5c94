import { EntityManager, LockMode } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { MyExportResponse } from '@thudline/contracts';
import { validate } from 'uuid';
import { Viewer } from '../access/viewer';
import { AuditService } from '../audit/audit.service';
import { notFound } from '../errors/app-error';
import { ObjectStoreService } from '../storage/object-store.service';
import { User } from '../users/entities/user.entity';
import { Export } from './entities/export.entity';
import { ExportQueue } from './export-queue';
import { exportResponseOf } from './exports.mapper';

const holds = `
  select
    (select count(*)::int from take where owner_id = u.id and deleted_at is null) as takes,
    (select count(*)::int from room where owner_id = u.id) as rooms,
    (select count(*)::int from note n join take t on t.id = n.take_id
      where t.owner_id = u.id and t.deleted_at is null and n.deleted_at is null) as notes,
    (select coalesce(sum(f.bytes), 0)::float8 from take_file f join take t on t.id = f.take_id
      where t.owner_id = u.id and t.deleted_at is null)
    + (select coalesce(sum(a.bytes), 0)::float8 from added_file a join take t on t.id = a.take_id
      where t.owner_id = u.id and t.deleted_at is null)
    + (select coalesce(sum(bytes), 0)::float8 from photo where owner_id = u.id) as bytes
  from "user" u where u.id = ?`;

const nothingHeld = { takes: 0, rooms: 0, notes: 0, bytes: 0 };

/** The archive of an account: one at a time, the newest takes the place of the one before. */
@Injectable()
export class ExportsService {
  constructor(
    private readonly em: EntityManager,
    private readonly queue: ExportQueue,
    private readonly objects: ObjectStoreService,
    private readonly audit: AuditService,
  ) {}

  async mine({ user }: Viewer): Promise<MyExportResponse> {
    const newest = await this.em.findOne(Export, { owner: user }, { orderBy: { id: 'desc' } });
    const [held] = await this.em.getConnection().execute<MyExportResponse['holds'][]>(holds, [user.id]);
    return { export: newest && exportResponseOf(newest), holds: held ?? nothingHeld };
  }

  /** One that is being made is the one that is asked for. */
  async ask({ user }: Viewer): Promise<Export> {
    const { asked, replaced } = await this.em.transactional(async (em) => {
      // Two tabs that ask at the same moment queue here.
      const owner = await em.findOneOrFail(User, user.id, { lockMode: LockMode.PESSIMISTIC_WRITE });
      const earlier = await em.find(Export, { owner });
      const underway = earlier.find(({ state }) => state === 'queued' || state === 'running');
      if (underway) return { asked: underway, replaced: [] };
      em.remove(earlier);
      const made = em.create(Export, { owner, state: 'queued', progress: 0, heartbeatAt: new Date() });
      this.audit.record({ kind: 'export-asked', userId: owner.id });
      await em.flush();
      await this.queue.send(em, made.id);
      return { asked: made, replaced: earlier };
    });
    await this.objects.remove(replaced.flatMap(({ objectKey }) => objectKey ?? []));
    return asked;
  }

  /** @throws {AppError} `not-found` where it isn't made, is somebody else's or over */
  async getMade({ user }: Viewer, exportId: string): Promise<Export & { objectKey: string; bytes: number }> {
    const made = validate(exportId)
      ? await this.em.findOne(Export, { id: exportId, owner: user, expiresAt: { $gt: new Date() } })
      : null;
    if (!made?.objectKey || !made.bytes) throw notFound();
    return made as Export & { objectKey: string; bytes: number };
  }
}
