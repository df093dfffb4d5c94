import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { ReportResponse, UserSettings } from '@thudline/contracts';
import { AppError } from '../errors/app-error';
import { PairSpectrum } from './entities/pair-spectrum.entity';
import { Report } from './entities/report.entity';
import { Take } from '../takes/entities/take.entity';
import { User } from '../users/entities/user.entity';
import { settingsOf } from '../users/user-settings';
import { storedFacts } from './report-columns';
import { ListFigures, listFiguresOf, reportResponseOf, saidBy } from './reports.mapper';

/** With their hits they are large; more are never held. */
const reportsAtOnce = 50;

const notMeasuredYet = () => new AppError('not-measured-yet', 'This take has not been measured yet.');

@Injectable()
export class ReportsService {
  constructor(private readonly em: EntityManager) {}

  /** Judged by the owner's target and temperature, told in the reader's units; a guest's are the owner's. */
  async get(takeId: string, reader: User | null): Promise<ReportResponse> {
    const { take, report, owner } = await this.currentReport(takeId);
    const before = await this.reportBefore(take);
    return reportResponseOf({
      report,
      owner,
      reader: reader ? settingsOf(reader) : owner,
      before: before && {
        report: before,
        doneActions: take.doneActions,
        spectra: { before: await this.spectrumOf(before), after: await this.spectrumOf(report) },
      },
    });
  }

  async getPairSpectrum(takeId: string): Promise<PairSpectrum> {
    const { report } = await this.currentReport(takeId);
    const spectrum = await this.spectrumOf(report);
    if (!spectrum) throw new AppError('not-found', 'No kick hit was found, so there is nothing to add up.');
    return spectrum;
  }

  /** @returns what lists show, by report id */
  async listFigures(reportIds: string[], owner: UserSettings): Promise<Map<string, ListFigures>> {
    const reports = await this.em.find(Report, { measurement: { $in: reportIds } });
    return new Map(reports.map((report) => [report.measurement.id, listFiguresOf(report, owner)]));
  }

  /** What sheets say was written with the owner's settings of then; after they changed they are told anew. */
  async tellAnew(owner: User): Promise<void> {
    const takes = await this.em.find(Take, { owner: owner.id, currentReportId: { $ne: null } });
    const ids = takes.flatMap((take) => take.currentReportId ?? []);
    const settings = settingsOf(owner);
    for (let start = 0; start < ids.length; start += reportsAtOnce) {
      const em = this.em.fork();
      const reports = await em.find(Report, {
        measurement: { $in: ids.slice(start, start + reportsAtOnce) },
      });
      // Only of clipped hits do the words count any; the others are told without loading theirs.
      await em.populate(
        reports.filter(({ kickClipped, overheadClipped }) => kickClipped || overheadClipped),
        ['hits', 'clipRuns'],
      );
      for (const report of reports) report.says = saidBy(factsToTell(report), settings);
      await em.flush();
    }
  }

  private spectrumOf(report: Report): Promise<PairSpectrum | null> {
    return this.em.findOne(PairSpectrum, { report, trackA: 0, trackB: 1 });
  }

  /** @returns the report of the take before, where something of it was carried out and it is still there */
  private async reportBefore({ followsTake, doneActions }: Take): Promise<Report | null> {
    if (!followsTake || doneActions.length === 0) return null;
    const take = await this.em.findOne(Take, { id: followsTake.id, deletedAt: null });
    return take?.currentReportId ? this.em.findOne(Report, { measurement: take.currentReportId }) : null;
  }

  private async currentReport(takeId: string) {
    const take = await this.em.findOneOrFail(Take, { id: takeId }, { populate: ['owner'] });
    if (!take.currentReportId) throw notMeasuredYet();
    const report = await this.em.findOneOrFail(
      Report,
      { measurement: take.currentReportId },
      { populate: ['measurement', 'hits', 'clipRuns'] },
    );
    return { take, report, owner: settingsOf(take.owner.unwrap()) };
  }
}

const factsToTell = ({ summary, hits = [], clipRuns = [] }: Partial<Report> & Pick<Report, 'summary'>) =>
  storedFacts({ summary, hits, clipRuns });
