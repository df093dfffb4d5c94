import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { ListTakesRequest, ListTakesResponse, NamedSetup } from '@thudline/contracts';
import { Viewer } from '../access/viewer';
import { measurementResponseOf } from '../measuring/measurement.mapper';
import { MeasurementsService } from '../measuring/measurements.service';
import { noteCounts } from '../notes/note-counts';
import { noListFigures } from '../reports/reports.mapper';
import { ReportsService } from '../reports/reports.service';
import { User } from '../users/entities/user.entity';
import { settingsOf } from '../users/user-settings';
import { restorableSince } from './deleted-takes';
import { Take } from './entities/take.entity';
import { cursorText, TakeCursor } from './take-cursor';
import { Sql, takeListQuery } from './take-list.query';

type Totals = Pick<ListTakesResponse, 'everyTotal' | 'deletedTotal'>;

const countTakes = `
  select count(*) filter (where deleted_at is null)::int as "everyTotal",
    count(*) filter (where deleted_at > ?)::int as "deletedTotal"
  from take where owner_id = ?`;

const usedTags = `
  select distinct unnest(tags) as tag from take where owner_id = ? and deleted_at is null order by tag`;

const usedSetups = `
  select id, name from setup where owner_id = ? and id in
    (select setup_id from take where owner_id = ? and deleted_at is null) order by lower(name), id`;

const noNotes = { notes: 0, newNotes: 0 };

/** A player's takes, as the sentence above the list asks for them. */
@Injectable()
export class TakeListsService {
  constructor(
    private readonly em: EntityManager,
    private readonly measurements: MeasurementsService,
    private readonly reports: ReportsService,
  ) {}

  async list({ user }: Viewer, request: ListTakesRequest): Promise<ListTakesResponse> {
    const settings = settingsOf(user);
    const query = takeListQuery(request, user.id, settings);
    const owner: unknown[] = [user.id];
    const [rows, [fitting], [totals], tags, setups] = await Promise.all([
      this.rows<TakeCursor>(query.ids),
      this.rows<{ total: number }>(query.count),
      this.rows<Totals>({ text: countTakes, values: [restorableSince(), ...owner] }),
      this.rows<{ tag: string }>({ text: usedTags, values: owner }),
      this.rows<NamedSetup>({ text: usedSetups, values: [...owner, ...owner] }),
    ]);
    const page = rows.slice(0, request.limit);
    const last = page.at(-1);
    return {
      items: await this.items(
        user,
        page.map(({ id }) => id),
      ),
      nextCursor: rows.length > request.limit && last ? cursorText(last) : null,
      total: fitting?.total ?? 0,
      everyTotal: totals?.everyTotal ?? 0,
      deletedTotal: totals?.deletedTotal ?? 0,
      tags: tags.map(({ tag }) => tag),
      setups,
    };
  }

  private rows<Row>({ text, values }: Sql): Promise<Row[]> {
    return this.em.getConnection().execute<Row[]>(text, values);
  }

  private async items(user: User, takeIds: string[]): Promise<ListTakesResponse['items']> {
    const takes = await this.em.find(Take, { id: { $in: takeIds } });
    const [measurements, notes, reported] = await Promise.all([
      this.measurements.latestOf(takeIds),
      noteCounts(this.em, user.id, takeIds),
      this.reports.listFigures(
        takes.flatMap((take) => take.currentReportId ?? []),
        settingsOf(user),
      ),
    ]);
    const byId = new Map(takes.map((take) => [take.id, take]));
    return takeIds.flatMap((id) => {
      const [take, measurement] = [byId.get(id), measurements.get(id)];
      if (!take || !measurement) return [];
      return {
        id,
        number: take.number,
        title: take.title,
        recordedAt: take.recordedAt.toISOString(),
        measurement: measurementResponseOf(measurement),
        ...(reported.get(take.currentReportId ?? '') ?? noListFigures),
        tags: take.tags,
        ...(notes.get(id) ?? noNotes),
        deletedAt: take.deletedAt?.toISOString() ?? null,
      };
    });
  }
}
