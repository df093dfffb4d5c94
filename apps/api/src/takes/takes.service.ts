import { EntityManager, FilterQuery } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { ListTakesRequest, ListTakesResponse, TakeResponse, UpdateTakeRequest } from '@thudline/contracts';
import { Viewer } from '../access/viewer';
import { AuditService } from '../audit/audit.service';
import { measurementResponseOf } from '../measuring/measurement.mapper';
import { MeasurementsService } from '../measuring/measurements.service';
import { noListFigures } from '../reports/reports.mapper';
import { ReportsService } from '../reports/reports.service';
import { TakeFile } from './entities/take-file.entity';
import { TakeTrack } from './entities/take-track.entity';
import { Take } from './entities/take.entity';
import { cursorText, parseCursor } from './take-cursor';
import { takeResponseOf } from './takes.mapper';

@Injectable()
export class TakesService {
  constructor(
    private readonly em: EntityManager,
    private readonly measurements: MeasurementsService,
    private readonly reports: ReportsService,
    private readonly audit: AuditService,
  ) {}

  async get(takeId: string): Promise<TakeResponse> {
    return this.whole(await this.em.findOneOrFail(Take, { id: takeId }));
  }

  async whole(take: Take): Promise<TakeResponse> {
    const [files, tracks, measurement] = await Promise.all([
      this.em.find(TakeFile, { take }, { orderBy: { position: 'asc' } }),
      this.em.find(TakeTrack, { take }, { orderBy: { position: 'asc' } }),
      this.measurements.getLatest(take.id),
    ]);
    return takeResponseOf({ take, files, tracks, measurement });
  }

  async list(viewer: Viewer, { cursor, limit }: ListTakesRequest): Promise<ListTakesResponse> {
    const mine: FilterQuery<Take> = { owner: viewer.user.id, deletedAt: null };
    const [total, found] = await Promise.all([
      this.em.count(Take, mine),
      this.em.find(Take, cursor ? { $and: [mine, below(cursor)] } : mine, {
        orderBy: { recordedAt: 'desc', id: 'desc' },
        limit: limit + 1,
      }),
    ]);
    const page = found.slice(0, limit);
    const last = page.at(-1);
    return {
      items: await this.listItems(viewer, page),
      nextCursor: found.length > limit && last ? cursorText(last) : null,
      total,
    };
  }

  async update(takeId: string, { title, note, tickedActions }: UpdateTakeRequest): Promise<TakeResponse> {
    const take = await this.em.findOneOrFail(Take, { id: takeId });
    if (title !== undefined) take.title = title;
    if (note !== undefined) take.note = note;
    if (tickedActions !== undefined) take.tickedActions = tickedActions;
    await this.em.flush();
    return this.whole(take);
  }

  /** The row and the recordings stay for a while, so that it can be undone; nobody sees them. */
  async remove(viewer: Viewer, takeId: string): Promise<void> {
    const take = await this.em.findOneOrFail(Take, { id: takeId });
    take.deletedAt = new Date();
    this.audit.record({ kind: 'take-deleted', userId: viewer.user.id, subjectId: take.id });
    await this.em.flush();
    await this.measurements.cancel(takeId);
  }

  private async listItems(viewer: Viewer, takes: Take[]): Promise<ListTakesResponse['items']> {
    const [measurements, reported] = await Promise.all([
      this.measurements.latestOf(takes.map((take) => take.id)),
      this.reports.listFigures(
        takes.flatMap((take) => take.currentReportId ?? []),
        viewer.user.settings,
      ),
    ]);
    return takes.flatMap((take) => {
      const measurement = measurements.get(take.id);
      if (!measurement) return [];
      const figures = reported.get(take.currentReportId ?? '') ?? noListFigures;
      return {
        id: take.id,
        number: take.number,
        title: take.title,
        recordedAt: take.recordedAt.toISOString(),
        measurement: measurementResponseOf(measurement),
        ...figures,
      };
    });
  }
}

function below(cursor: string): FilterQuery<Take> {
  const { recordedAt, id } = parseCursor(cursor);
  // The first condition alone lets the index begin at the right row.
  return {
    recordedAt: { $lte: recordedAt },
    $or: [{ recordedAt: { $lt: recordedAt } }, { id: { $lt: id } }],
  };
}
