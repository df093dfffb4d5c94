import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { ReportResponse, UserSettings } from '@thudline/contracts';
import { decodePairSpectrum, PairSpectrum as PairSpectrumFacts, TakeFacts } from '@thudline/dsp';
import { AppError } from '../errors/app-error';
import { PairSpectrum } from './entities/pair-spectrum.entity';
import { Report } from './entities/report.entity';
import { Take } from '../takes/entities/take.entity';
import { User } from '../users/entities/user.entity';
import { settingsOf } from '../users/user-settings';
import { storedFacts } from './report-columns';
import { ListFigures, listFiguresOf, reportResponseOf } from './reports.mapper';

export interface MeasuredTake {
  /** With its setup. */
  take: Take;
  /** Whose target and temperature the take is judged by. */
  owner: UserSettings;
  facts: TakeFacts;
  /** Null where no kick hit was found. */
  spectrum: PairSpectrumFacts | null;
}

const notMeasuredYet = () => new AppError('not-measured-yet', 'This take has not been measured yet.');

const noSuchVersion = () =>
  new AppError('not-found', 'This take was not measured with that version of the measurements.');

interface WhichReport {
  takeId: string;
  /** Of the measurements; the current report without. */
  version?: string;
}

@Injectable()
export class ReportsService {
  constructor(private readonly em: EntityManager) {}

  /** Judged by the owner's target and temperature, told in the reader's units; a guest's are the owner's. */
  async get({ reader, ...which }: WhichReport & { reader: User | null }): Promise<ReportResponse> {
    const { take, report, owner } = await this.getReport(which);
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

  async getPairSpectrum(which: WhichReport): Promise<PairSpectrum> {
    const { report } = await this.getReport(which);
    const spectrum = await this.spectrumOf(report);
    if (!spectrum) throw new AppError('not-found', 'No kick hit was found, so there is nothing to add up.');
    return spectrum;
  }

  /** What was measured of a take, whole. */
  async getMeasured(takeId: string): Promise<MeasuredTake> {
    const { take, report, owner } = await this.getReport({ takeId });
    const spectrum = await this.spectrumOf(report);
    await this.em.populate(take, ['setup', 'room']);
    return {
      take,
      owner,
      facts: storedFacts(report),
      spectrum: spectrum && decodePairSpectrum(spectrum.data, spectrum),
    };
  }

  /** @returns what lists show, by report id */
  async listFigures(reportIds: string[], owner: UserSettings): Promise<Map<string, ListFigures>> {
    const reports = await this.em.find(Report, { measurement: { $in: reportIds } });
    return new Map(reports.map((report) => [report.measurement.id, listFiguresOf(report, owner)]));
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

  private async getReport({ takeId, version }: WhichReport) {
    const take = await this.em.findOneOrFail(Take, { id: takeId }, { populate: ['owner'] });
    if (!take.currentReportId) throw notMeasuredYet();
    const which = version
      ? { take, measurement: { dspVersion: version } }
      : { measurement: take.currentReportId };
    const report = await this.em.findOne(Report, which, { populate: ['measurement', 'hits', 'clipRuns'] });
    if (!report) throw noSuchVersion();
    return { take, report, owner: settingsOf(take.owner.unwrap()) };
  }
}
