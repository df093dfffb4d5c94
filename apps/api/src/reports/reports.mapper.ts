import { ReportResponse, TakeListItem, UserSettings } from '@thudline/contracts';
import { findings, nextActions, reportFigures, reportLine, takeSummary } from '@thudline/dsp';
import { Report } from './entities/report.entity';
import { storedFacts } from './report-columns';

export type ListFigures = Pick<
  TakeListItem,
  'summary' | 'kickPeakDbfs' | 'kickClipped' | 'overheadPeakDbfs' | 'overheadClipped' | 'lowEndDb'
>;

export const noListFigures: ListFigures = {
  summary: null,
  kickPeakDbfs: null,
  kickClipped: false,
  overheadPeakDbfs: null,
  overheadClipped: false,
  lowEndDb: null,
};

export function listFiguresOf(report: Report, { target, temperatureC }: UserSettings): ListFigures {
  const { kickPeakDbfs, kickClipped, overheadPeakDbfs, overheadClipped, lowEndDb } = report;
  return {
    summary: takeSummary(reportFigures(report.summary, { target, temperatureC })),
    kickPeakDbfs: kickPeakDbfs ?? null,
    kickClipped,
    overheadPeakDbfs: overheadPeakDbfs ?? null,
    overheadClipped,
    lowEndDb: lowEndDb ?? null,
  };
}

interface ReportParts {
  report: Report;
  /** Whose target and temperature the take is judged by. */
  owner: UserSettings;
  /** Whose units it is told in. */
  reader: UserSettings;
}

export function reportResponseOf({ report, owner, reader }: ReportParts): ReportResponse {
  const { target, temperatureC } = owner;
  const facts = storedFacts(report);
  const figures = reportFigures(facts, { target, temperatureC });
  const told = { lengthUnit: reader.lengthUnit, target };
  return {
    ...figures,
    findings: findings(figures, told),
    takeId: report.take.id,
    dspVersion: report.measurement.unwrap().dspVersion,
    measuredAt: report.createdAt.toISOString(),
    target,
    temperatureC,
    line: reportLine(figures, told),
    actions: nextActions(figures, told),
    pairSpectrum: facts.pairs[0]?.spectrum ?? null,
  };
}
