import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { ReportResponse, UserSettings } from '@thudline/contracts';
import { AppError } from '../errors/app-error';
import { PairSpectrum } from './entities/pair-spectrum.entity';
import { Report } from './entities/report.entity';
import { Take } from '../takes/entities/take.entity';
import { User } from '../users/entities/user.entity';
import { settingsOf } from '../users/user-settings';
import { ListFigures, listFiguresOf, reportResponseOf, saidBy } from './reports.mapper';

const notMeasuredYet = () => new AppError('not-measured-yet', 'This take has not been measured yet.');

@Injectable()
export class ReportsService {
  constructor(private readonly em: EntityManager) {}

  /** Judged by the owner's target and temperature, told in the reader's units; a guest's are the owner's. */
  async get(takeId: string, reader: User | null): Promise<ReportResponse> {
    const { report, owner } = await this.currentReport(takeId);
    return reportResponseOf({ report, owner, reader: reader ? settingsOf(reader) : owner });
  }

  async getPairSpectrum(takeId: string): Promise<PairSpectrum> {
    const { report } = await this.currentReport(takeId);
    const spectrum = await this.em.findOne(PairSpectrum, { report, trackA: 0, trackB: 1 });
    if (!spectrum) throw new AppError('not-found', 'No kick hit was found, so there is nothing to add up.');
    return spectrum;
  }

  /** @returns what lists show, by report id */
  async listFigures(reportIds: string[], owner: UserSettings): Promise<Map<string, ListFigures>> {
    const reports = await this.em.find(Report, { measurement: { $in: reportIds } });
    return new Map(reports.map((report) => [report.measurement.id, listFiguresOf(report, owner)]));
  }

  /** What sheets say was written with the owner's target of then; after it changed they are told anew. */
  async tellAnew(owner: User): Promise<void> {
    const takes = await this.em.find(Take, { owner, currentReportId: { $ne: null } });
    const ids = takes.flatMap((take) => take.currentReportId ?? []);
    const settings = settingsOf(owner);
    for (const report of await this.em.find(Report, { measurement: { $in: ids } }))
      report.says = saidBy(report.summary, settings);
    await this.em.flush();
  }

  private async currentReport(takeId: string) {
    const take = await this.em.findOneOrFail(Take, { id: takeId }, { populate: ['owner'] });
    if (!take.currentReportId) throw notMeasuredYet();
    const report = await this.em.findOneOrFail(
      Report,
      { measurement: take.currentReportId },
      { populate: ['measurement', 'hits', 'clipRuns'] },
    );
    return { report, owner: settingsOf(take.owner.unwrap()) };
  }
}
