import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { FailedWork } from '@thudline/contracts';
import { validate } from 'uuid';
import { Viewer } from '../access/viewer';
import { AddedFilesService } from '../added-files/added-files.service';
import { AddedFile } from '../added-files/entities/added-file.entity';
import { AuditService } from '../audit/audit.service';
import { notFound } from '../errors/app-error';
import { Export } from '../exports/entities/export.entity';
import { ExportQueue } from '../exports/export-queue';
import { Measurement } from '../measuring/entities/measurement.entity';
import { MeasurementsService } from '../measuring/measurements.service';
import { FailedRow, failedWorkOf, failedWorkQuery, retryMail } from './failed-work.query';

/** Work that failed, and having it done after all. */
@Injectable()
export class AdminWorkService {
  constructor(
    private readonly em: EntityManager,
    private readonly measurements: MeasurementsService,
    private readonly addedFiles: AddedFilesService,
    private readonly exports: ExportQueue,
    private readonly audit: AuditService,
  ) {}

  async list(): Promise<FailedWork[]> {
    const rows = await this.em.getConnection().execute<FailedRow[]>(failedWorkQuery);
    return rows.map(failedWorkOf);
  }

  /** @throws {AppError} `not-found` where it isn't there, or hasn't failed */
  async retry({ user }: Viewer, kind: string, id: string): Promise<void> {
    const again = new Map<string, (workId: string) => Promise<void>>([
      ['measurement', (workId) => this.measure(workId)],
      ['added-file', (workId) => this.addFiles(workId)],
      ['export', (workId) => this.export(workId)],
      ['mail', (workId) => this.mail(workId)],
    ]).get(kind);
    if (!again || !validate(id)) throw notFound();
    await again(id);
    this.audit.record({ kind: 'work-retried', userId: user.id, subjectId: id });
    await this.em.flush();
  }

  private async measure(id: string): Promise<void> {
    const failed = await this.em.findOne(Measurement, { id, state: 'failed' });
    if (!failed) throw notFound();
    await this.measurements.again(failed.take.id);
  }

  private async addFiles(id: string): Promise<void> {
    const failed = await this.em.findOne(AddedFile, { id, state: 'failed' });
    if (!failed) throw notFound();
    await this.addedFiles.make(failed.take.id, failed);
  }

  private async export(id: string): Promise<void> {
    await this.em.transactional(async (em) => {
      const waiting = {
        state: 'queued',
        progress: 0,
        attempt: 0,
        reason: null,
        heartbeatAt: new Date(),
      } as const;
      const changed = await em.nativeUpdate(Export, { id, state: 'failed' }, waiting);
      if (changed === 0) throw notFound();
      await this.exports.send(em, id);
    });
  }

  private async mail(id: string): Promise<void> {
    const changed = await this.em.getConnection().execute<unknown[]>(retryMail, [id]);
    if (changed.length === 0) throw notFound();
  }
}
