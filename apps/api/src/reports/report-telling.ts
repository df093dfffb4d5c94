import { EntityManager, FilterQuery } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { Report } from './entities/report.entity';
import { Take } from '../takes/entities/take.entity';
import { User } from '../users/entities/user.entity';
import { settingsOf } from '../users/user-settings';
import { storedFacts } from './report-columns';
import { toldColumns } from './reports.mapper';

/** With their hits they are large; more are never held. */
const reportsAtOnce = 50;

/** Writes beside reports what their sheets say, for finding and filtering takes. */
@Injectable()
export class ReportTelling {
  constructor(private readonly em: EntityManager) {}

  /** What sheets say was written with the owner's settings of then; after they changed they are told anew. */
  async tellAnew(owner: User): Promise<void> {
    const takes = await this.em.find(Take, { owner: owner.id, currentReportId: { $ne: null } });
    const ids = takes.flatMap((take) => take.currentReportId ?? []);
    for (let start = 0; start < ids.length; start += reportsAtOnce)
      await this.tell({ measurement: { $in: ids.slice(start, start + reportsAtOnce) } });
  }

  /** Reports of before lists could be filtered by what they say. Safe to stop, and for many workers at once. */
  async tellUntold(): Promise<void> {
    while ((await this.tell({ topics: null })) === reportsAtOnce);
  }

  /** @returns how many it was, at most `reportsAtOnce` */
  private async tell(which: FilterQuery<Report>): Promise<number> {
    const em = this.em.fork();
    const reports = await em.find(Report, which, { populate: ['take.owner'], limit: reportsAtOnce });
    // Only of clipped hits do the words count any; the others are told without loading theirs.
    await em.populate(
      reports.filter(({ kickClipped, overheadClipped }) => kickClipped || overheadClipped),
      ['hits', 'clipRuns'],
    );
    for (const report of reports) {
      const { owner } = report.take.unwrap();
      em.assign(report, toldColumns(factsToTell(report), settingsOf(owner.unwrap())));
    }
    await em.flush();
    return reports.length;
  }
}

const factsToTell = ({ summary, hits = [], clipRuns = [] }: Partial<Report> & Pick<Report, 'summary'>) =>
  storedFacts({ summary, hits, clipRuns });
