import { Box } from '@chakra-ui/react';
import type { ReportResponse } from '@thudline/contracts';
import { lazy, Suspense } from 'react';
import { number } from '../../../lib/format';
import { Findings } from './Findings';
import { MarginNote } from './RuledSheet';
import { findingsOf, levelTopics, levelsWord, worstStatus } from './sectionWords';
import { SheetSection } from './SheetSection';

/** The pictures come after the words; as tall as the strip will be, whose layout isn’t there yet. */
const HitStrip = lazy(async () => ({ default: (await import('../pictures/HitStrip')).HitStrip }));
const stripHeight = '180px';

/** Levels: both microphones' hits against the target, and what to turn at the preamp. */
export function LevelsSection({
  report,
  chosenHit,
  onChooseHit,
}: {
  report: ReportResponse;
  chosenHit: number | null;
  onChooseHit: (hitIndex: number) => void;
}) {
  const findings = findingsOf(report, levelTopics);
  const { lowDbfs, highDbfs, aimDbfs } = report.target;
  return (
    <SheetSection
      id="levels"
      title="Levels"
      word={levelsWord(report)}
      status={worstStatus(findings)}
      note={
        <MarginNote from="Thudline" about="the target">
          {number(lowDbfs, 0)} to {number(highDbfs, 0)} dBFS for the hardest hit, aim {number(aimDbfs, 0)}:
          common practice, not a standard.
        </MarginNote>
      }
    >
      <Findings findings={findings} />
      <Suspense fallback={<Box height={stripHeight} marginTop="14px" />}>
        <HitStrip report={report} chosenHit={chosenHit} onChoose={onChooseHit} />
      </Suspense>
    </SheetSection>
  );
}
