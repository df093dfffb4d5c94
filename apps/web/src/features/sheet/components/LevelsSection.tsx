import type { ReportResponse } from '@thudline/contracts';
import { number } from '../../../lib/format';
import { HitStrip } from '../pictures/HitStrip';
import { Findings } from './Findings';
import { MarginNote } from './RuledSheet';
import { findingsOf, levelTopics, levelsWord, worstStatus } from './sectionWords';
import { SheetSection } from './SheetSection';

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
      <HitStrip report={report} chosenHit={chosenHit} onChoose={onChooseHit} />
    </SheetSection>
  );
}
