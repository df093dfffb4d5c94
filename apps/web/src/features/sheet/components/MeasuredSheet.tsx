import { Flex } from '@chakra-ui/react';
import type { MeResponse, ReportResponse, TakeResponse } from '@thudline/contracts';
import { useMemo, useState } from 'react';
import { useChoice } from '../hooks/useChoice';
import { useListening } from '../hooks/useListening';
import { usePairSpectrum } from '../hooks/usePairSpectrum';
import { AddingUpSection } from './AddingUpSection';
import { FiguresSection } from './FiguresSection';
import { HearTake } from './HearTake';
import { LevelsSection } from './LevelsSection';
import { NextActions } from './NextActions';
import { RuledSheet, SheetRow } from './RuledSheet';
import {
  addingUpTopics,
  findingsOf,
  levelTopics,
  levelsWord,
  verdictWord,
  worstStatus,
} from './sectionWords';
import { SheetContents, type ContentsEntry } from './SheetContents';
import { TakeLine } from './TakeLine';
import { TakeNote } from './TakeNote';
import { ButtonLink } from '../../../components/ButtonLink';
import { FilesFindings } from './FilesFindings';

/** The sheet of a measured take, top to bottom. The chosen hit and the choice are one for the whole sheet. */
export function MeasuredSheet({
  take,
  report,
  me,
}: {
  take: TakeResponse;
  report: ReportResponse;
  me: MeResponse;
}) {
  const kickHits = useMemo(() => report.hits.flatMap((hit, i) => (hit.kind === 'kick' ? [i] : [])), [report]);
  const [chosenHit, setChosenHit] = useState(() => loudest(report, kickHits));
  const pair = usePairSpectrum(report);
  const bench = useChoice(report.agreement);
  const listening = useListening({
    report,
    spectrum: pair.spectrum,
    choices: bench.choices,
    chosen: bench.chosen,
  });
  const chooseKick = (index: number) => setChosenHit(nearestKick(report, kickHits, index));
  return (
    <RuledSheet>
      <SheetRow note={<TakeNote take={take} author={me.name} />}>
        <TakeLine take={take} report={report} />
        <NextActions take={take} actions={report.actions} />
        <Flex gap="14px" marginTop="14px" wrap="wrap" _print={{ display: 'none' }}>
          <ButtonLink to="/takes/new">Add the next take</ButtonLink>
          <HearTake listening={listening} durationS={report.durationS} />
        </Flex>
        <SheetContents entries={contents(report)} />
        <FilesFindings report={report} />
      </SheetRow>
      <LevelsSection report={report} chosenHit={chosenHit} onChooseHit={chooseKick} />
      <AddingUpSection
        {...{ report, pair, bench, listening, kickHits, chosenHit }}
        onChooseHit={setChosenHit}
      />
      <FiguresSection take={take} report={report} settings={me.settings} />
    </RuledSheet>
  );
}

function contents(report: ReportResponse): ContentsEntry[] {
  const levels = findingsOf(report, levelTopics);
  const addingUp = findingsOf(report, addingUpTopics);
  const verdictStatus = addingUp.find((finding) => finding.topic === 'adding-up')?.status;
  return [
    { id: 'levels', title: 'Levels', word: levelsWord(report), status: worstStatus(levels) },
    {
      id: 'adding-up',
      title: 'Adding up',
      word: verdictWord(report),
      status: verdictStatus ?? worstStatus(addingUp),
    },
    { id: 'figures', title: 'All figures' },
  ];
}

/** The hit to begin with: the loudest kick, since gain and polarity are judged by it. */
function loudest(report: ReportResponse, kickHits: readonly number[]): number | null {
  const level = (index: number) => report.hits[index].kickPeakDbfs ?? -Infinity;
  return kickHits.reduce<number | null>(
    (best, index) => (best === null || level(index) > level(best) ? index : best),
    null,
  );
}

/** A dot of the overhead's line may be a snare or a crash: the trace then shows the kick nearest to it. */
function nearestKick(report: ReportResponse, kickHits: readonly number[], index: number): number | null {
  const far = (other: number) => Math.abs(report.hits[other].timeS - report.hits[index].timeS);
  return kickHits.reduce<number | null>(
    (best, other) => (best === null || far(other) < far(best) ? other : best),
    null,
  );
}
