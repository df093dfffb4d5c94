import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { Report } from '../reports/entities/report.entity';
import { Take } from '../takes/entities/take.entity';
import { SetupUse } from './setups.mapper';

/** As many as a line of text names. */
const namedTakes = 5;
/** As in the finding on arrival: below, it may be another hit’s. */
const sureConfidence = 0.5;
/** How far back a told arrival is looked for. */
const askedReports = 20;

const useOfAll = `
  select setup_id as "setupId", count(*)::int as "takeCount", max(recorded_at) as "lastUsedAt"
  from take where owner_id = ? and setup_id is not null and deleted_at is null group by setup_id`;

interface UseRow {
  setupId: string;
  takeCount: number;
  lastUsedAt: string | Date;
}

/** Which takes were recorded with a setup, and what the newest of them measured. */
@Injectable()
export class SetupUses {
  constructor(private readonly em: EntityManager) {}

  async of(setupId: string): Promise<SetupUse> {
    const [takes, takeCount] = await this.em.findAndCount(
      Take,
      { setup: setupId, deletedAt: null },
      { orderBy: { recordedAt: 'desc', id: 'desc' }, limit: askedReports },
    );
    return {
      takeCount,
      takes: takes.slice(0, namedTakes).map(({ id, number }) => ({ id, number })),
      measured: await this.measured(takes),
    };
  }

  async ofAll(ownerId: string): Promise<Map<string, { takeCount: number; lastUsedAt: Date }>> {
    const rows = await this.em.getConnection().execute<UseRow[]>(useOfAll, [ownerId]);
    return new Map(
      rows.map(({ setupId, takeCount, lastUsedAt }) => [
        setupId,
        { takeCount, lastUsedAt: new Date(lastUsedAt) },
      ]),
    );
  }

  private async measured(takes: Take[]): Promise<SetupUse['measured']> {
    const reportIds = takes.flatMap(({ currentReportId }) => currentReportId ?? []);
    const reports = await this.em.find(Report, { measurement: { $in: reportIds } });
    const byTake = new Map(reports.map((report) => [report.take.id, report]));
    for (const { id, number } of takes) {
      const arrival = byTake.get(id)?.summary.pairs[0]?.arrival;
      if (arrival?.arrivalMs == null || arrival.confidence < sureConfidence) continue;
      const { arrivalMs, arrivalIqrMs } = arrival;
      return { takeId: id, number, arrivalMs, arrivalIqrMs };
    }
    return null;
  }
}
