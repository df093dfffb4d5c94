import { ReportResponse, TakeListItem, UserSettings } from '@thudline/contracts';
import {
  decodePairSpectrum,
  findings,
  nextActions,
  outcomes,
  reportFigures,
  reportLine,
  TakeFacts,
  takeSummary,
} from '@thudline/dsp';
import { PairSpectrum } from './entities/pair-spectrum.entity';
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

/**
 * What the sheet says, in its owner's words: for finding a take by them. What is good names what isn't, so it's left out.
 * And what its findings ask something about.
 */
export function toldColumns(
  facts: TakeFacts,
  { target, temperatureC, lengthUnit }: UserSettings,
): Pick<Report, 'says' | 'topics'> {
  const figures = reportFigures(facts, { target, temperatureC });
  const { strong, rest } = takeSummary(figures);
  const told = { lengthUnit, target };
  const found = findings(figures, told);
  const sentences = found.flatMap(({ status, sentence }) => (status === 'good' ? [] : sentence));
  const line = reportLine(figures, told).map(({ action, reason }) => `${action} ${reason}`);
  const asking = found.flatMap(({ status, topic }) => (status === 'fix' || status === 'watch' ? topic : []));
  return {
    says: [strong, rest, ...line, ...sentences].filter(Boolean).join('\n'),
    topics: [...new Set(asking)],
  };
}

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
  /** The take that this one follows, and what was carried out in between. */
  before: TakeBefore | null;
}

interface TakeBefore {
  report: Report;
  doneActions: string[];
  spectra: Record<'before' | 'after', PairSpectrum | null>;
}

export function reportResponseOf({ report, owner, reader, before }: ReportParts): ReportResponse {
  const { target, temperatureC } = owner;
  const facts = storedFacts(report);
  const figures = reportFigures(facts, { target, temperatureC });
  const told = { lengthUnit: reader.lengthUnit, target };
  const becameOf = before
    ? outcomes({
        before: reportFigures(before.report.summary, { target, temperatureC }),
        after: figures,
        doneActions: before.doneActions,
        reader: told,
        spectra: { before: decoded(before.spectra.before), after: decoded(before.spectra.after) },
      })
    : [];
  return {
    ...figures,
    findings: findings(figures, told),
    takeId: report.take.id,
    dspVersion: report.measurement.unwrap().dspVersion,
    measuredAt: report.createdAt.toISOString(),
    target,
    temperatureC,
    line: reportLine(figures, told, becameOf),
    actions: nextActions(figures, told),
    outcomes: becameOf,
    pairSpectrum: facts.pairs[0]?.spectrum ?? null,
  };
}

const decoded = (spectrum: PairSpectrum | null) => spectrum && decodePairSpectrum(spectrum.data, spectrum);
