import { Flex } from '@chakra-ui/react';
import type { ReportResponse } from '@thudline/contracts';
import { ButtonLink } from '../../../components/ButtonLink';
import type { Listening } from '../hooks/useListening';
import { NotePlace } from '../notePlaces';
import { FilesFindings } from './FilesFindings';
import { HearTake } from './HearTake';
import type { MeasuredSheetProps } from './MeasuredSheet';
import { NextActions } from './NextActions';
import { Outcomes } from './Outcomes';
import { SheetRow } from './RuledSheet';
import {
  addingUpTopics,
  balanceTopics,
  balanceWord,
  findingsOf,
  levelTopics,
  levelsWord,
  roomTopics,
  roomWord,
  verdictWord,
  worstStatus,
} from './sectionWords';
import { SheetContents, type ContentsEntry } from './SheetContents';
import { TakeLine } from './TakeLine';
import { TakeNote } from './TakeNote';

type SheetTopProps = Omit<MeasuredSheetProps, 'settings'> & { listening: Listening };

/** The line, what became of the last changes, what to do before the next take, and what the sheet holds. */
export function SheetTop({ take, report, listening, above, marginHead, moreButtons }: SheetTopProps) {
  const { change, listen } = take.rights;
  return (
    <SheetRow
      note={
        <>
          {marginHead}
          <TakeNote take={take} />
          <NotePlace name="margin:top" />
        </>
      }
    >
      {above}
      <TakeLine take={take} report={report} />
      <Outcomes take={take} report={report} />
      <NextActions take={take} actions={report.actions} />
      <Flex gap="14px" marginTop="14px" wrap="wrap" _print={{ display: 'none' }}>
        {change && <ButtonLink to={`/takes/new?follows=${take.id}`}>Add the next take</ButtonLink>}
        {moreButtons}
        {listen && (
          <HearTake listening={listening} durationS={report.durationS} look={change ? 'outline' : 'solid'} />
        )}
        <NotePlace name="button" />
      </Flex>
      <SheetContents entries={contents(report)} />
      <FilesFindings report={report} />
    </SheetRow>
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
    ...measuredSections(report),
    { id: 'whole-take', title: 'Whole take' },
    { id: 'figures', title: 'All figures' },
  ];
}

/** Sections that a take measured before they were doesn't have. */
function measuredSections(report: ReportResponse): ContentsEntry[] {
  const { balance, room } = report;
  const status = (topics: Parameters<typeof findingsOf>[1]) => worstStatus(findingsOf(report, topics));
  const drums = { id: 'drums', title: 'Drums and cymbals', status: status(balanceTopics) };
  const decay = { id: 'room', title: 'Room', status: status(roomTopics) };
  return [
    ...(balance ? [{ ...drums, word: balanceWord(balance) }] : []),
    ...(room ? [{ ...decay, word: roomWord(room) }] : []),
  ];
}
