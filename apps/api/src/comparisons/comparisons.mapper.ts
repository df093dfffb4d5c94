import { ComparedTake, ComparisonResponse, UserSettings } from '@thudline/contracts';
import {
  comparedNames,
  comparedPolarity,
  compareTakes,
  comparisonCaveats,
  comparisonLine,
  ComparedFigure,
  findings,
  outcomes,
  polarityBetween,
  reportFigures,
} from '@thudline/dsp';
import { TakeRights } from '../access/take-rights';
import { MeasuredTake } from '../reports/reports.service';
import { Take } from '../takes/entities/take.entity';
import { between } from './between';

interface ComparedParts {
  before: MeasuredTake;
  after: MeasuredTake;
  /** Whose units it is told in. */
  reader: UserSettings;
  rights: TakeRights;
}

export function comparisonResponseOf({ before, after, reader, rights }: ComparedParts): ComparisonResponse {
  const noted = between({
    before: before.take,
    after: after.take,
    rights,
    lengthUnit: reader.lengthUnit,
  });
  const figures = {
    before: reportFigures(before.facts, before.owner),
    after: reportFigures(after.facts, after.owner),
  };
  const spectra = { before: before.spectrum, after: after.spectrum };
  const told = { lengthUnit: reader.lengthUnit, target: after.owner.target };
  const isSameTake = before.take.id === after.take.id;
  const facts = { before: before.facts, after: after.facts };
  const sound = polarityBetween({ ...facts, spectra });
  const polarity = comparedPolarity({ ...figures, sound, notedFlip: noted.flip });
  const changes = compareTakes({ ...facts, gainKnownSame: noted.gain === 'same' });
  const becameOf = outcomes({ ...figures, doneActions: noted.doneActions, reader: told, spectra });
  return {
    before: comparedTakeOf(before.take, rights),
    after: comparedTakeOf(after.take, rights),
    line: comparisonLine({ isSameTake, outcomes: becameOf, polarity, figures: changes }),
    differed: noted.differed,
    same: noted.same,
    polarity,
    findings: sideBySide(
      findings(figures.before, { ...told, target: before.owner.target }),
      findings(figures.after, told),
    ),
    figures: changes.map(comparedFigureOf),
    caveats: comparisonCaveats({ figures: changes, polarity, gain: noted.gain }),
  };
}

function comparedTakeOf({ id, number, title, recordedAt }: Take, rights: TakeRights): ComparedTake {
  return { id, number, title, recordedAt: recordedAt.toISOString(), canListen: rights.listen };
}

type Findings = ReturnType<typeof findings>;

/** In the order of the later take's; topics that only the earlier one has come last. */
function sideBySide(before: Findings, after: Findings): ComparisonResponse['findings'] {
  const topics = new Set([...after, ...before].map(({ topic }) => topic));
  const of = (all: Findings, topic: Findings[number]['topic']) =>
    all.find((finding) => finding.topic === topic) ?? null;
  return [...topics].map((topic) => ({ topic, before: of(before, topic), after: of(after, topic) }));
}

function comparedFigureOf({ step, ...figure }: ComparedFigure): ComparisonResponse['figures'][number] {
  return { ...figure, ...comparedNames[figure.key], step: step.size, isShare: step.kind === 'share' };
}
