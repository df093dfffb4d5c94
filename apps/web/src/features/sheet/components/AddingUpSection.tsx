import type { ReportResponse } from '@thudline/contracts';
import { thirdOctaves } from '@thudline/dsp';
import { lazy, Suspense } from 'react';
import { hertz, signedDecibels } from '../../../lib/format';
import { Findings } from './Findings';
import { MarginNote } from './RuledSheet';
import { addingUpTopics, findingsOf, verdictWord, worstStatus } from './sectionWords';
import { SheetSection } from './SheetSection';
import { BenchLoading } from './BenchLoading';
import type { AddedFilesProps } from './AddedFiles';
import type { PairBenchProps } from './PairBench';

/** The pictures come after the words: who opened a link on a phone reads before they are there. */
const PairBench = lazy(async () => ({ default: (await import('./PairBench')).PairBench }));

const AddedFiles = lazy(async () => ({ default: (await import('./AddedFiles')).AddedFiles }));

type AddingUpProps = Omit<PairBenchProps, 'chosenHit'> & { chosenHit: number | null } & Pick<
    AddedFilesProps,
    'take'
  >;

/** Adding up: whether the two microphones help or cancel, seen and heard. */
export function AddingUpSection({ chosenHit, take, ...props }: AddingUpProps) {
  const { report } = props;
  const findings = findingsOf(report, addingUpTopics);
  const verdictFinding = findings.find((finding) => finding.topic === 'adding-up');
  return (
    <SheetSection
      id="adding-up"
      title="Adding up"
      word={verdictWord(report)}
      status={verdictFinding?.status ?? worstStatus(findings)}
      note={<Caveats report={report} />}
    >
      <Findings findings={findings} />
      {report.pairSpectrum && chosenHit !== null && (
        <Suspense fallback={<BenchLoading />}>
          <PairBench {...props} chosenHit={chosenHit} />
        </Suspense>
      )}
      {take.rights.download && (
        <Suspense>
          <AddedFiles take={take} bench={props.bench} listening={props.listening} />
        </Suspense>
      )}
    </SheetSection>
  );
}

const nominal = (centreHz: number) =>
  thirdOctaves.find((band) => Math.abs(band.centreHz / centreHz - 1) < 0.01)?.nominal ?? hertz(centreHz);

/** Remarks that belong to the verdict: what would change it, and what is no fault. */
function Caveats({ report: { agreement, arrival } }: { report: ReportResponse }) {
  const { lowCut, contraryBands, verdict } = agreement;
  const opposite =
    arrival.firstSwing.kick !== null &&
    arrival.firstSwing.overhead !== null &&
    arrival.firstSwing.kick !== arrival.firstSwing.overhead;
  return (
    <>
      {lowCut && lowCut.verdict !== verdict && verdict !== 'cannot-tell' && (
        <MarginNote from="Thudline" about="low cut">
          This holds without a low cut on the overhead. With one at 80 Hz the flip would change the low end by{' '}
          {signedDecibels(lowCut.flipGainMatchedDb)}.
        </MarginNote>
      )}
      {contraryBands.length > 0 && (
        <MarginNote from="Thudline" about="the other way">
          {contraryBands.length === 1 ? 'One third-octave goes' : 'Some third-octaves go'} the other way with
          a flip:{' '}
          {contraryBands
            .map((band) => `${nominal(band.centreHz)} Hz by ${signedDecibels(band.flipGainDb)}`)
            .join(', ')}
          . Compare by ear.
        </MarginNote>
      )}
      {opposite && (
        <MarginNote from="Thudline" about="first swing">
          The two first swing in opposite directions. Many kits do so by nature; that alone is no fault.
        </MarginNote>
      )}
    </>
  );
}
