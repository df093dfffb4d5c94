import { Box } from '@chakra-ui/react';
import type { ReportResponse } from '@thudline/contracts';
import { ChoiceRow } from '../../sheet/components/ChoiceRow';
import { LowEndOfChoices } from '../../sheet/components/LowEndOfChoices';
import { MarginNote, SheetRow } from '../../sheet/components/RuledSheet';
import { useChoice } from '../../sheet/hooks/useChoice';
import { useHitExcerpt } from '../../sheet/hooks/useHitExcerpt';
import { useListening } from '../../sheet/hooks/useListening';
import { usePairSpectrum } from '../../sheet/hooks/usePairSpectrum';
import { LiveFinding } from './LiveFinding';

/** Play a hit, flip it, and see what that does to the low end. */
export function LiveBench({
  report,
  kickHits,
  chosenHit,
  onChooseHit,
}: {
  report: ReportResponse;
  kickHits: number[];
  chosenHit: number;
  onChooseHit: (hitIndex: number) => void;
}) {
  const { spectrum, error } = usePairSpectrum(report);
  const bench = useChoice(report.agreement);
  const listening = useListening({ report, spectrum, bench });
  // Two choices are enough to hear what a flip does; the line below shows the others as ticks.
  const twoChoices = {
    ...bench,
    choices: bench.named.filter(({ name }) => name === 'as-recorded' || name === 'flipped'),
  };
  const hitExcerpt = useHitExcerpt(report, chosenHit);
  const hitNumber = kickHits.indexOf(chosenHit) + 1;
  return (
    <SheetRow
      note={
        <Box marginTop={{ lg: '16px' }}>
          <MarginNote from="adding up">Press play, then flip it, and hear what it does.</MarginNote>
        </Box>
      }
    >
      <LiveFinding report={report} topics={['adding-up']} />
      <ChoiceRow
        bench={twoChoices}
        {...{ report, listening, kickHits, chosenHit, onChooseHit, hitExcerpt, hitNumber }}
        canListen
      />
      {spectrum ? (
        <LowEndOfChoices spectrum={spectrum} bench={bench} />
      ) : (
        <Box height="105px" role="status" aria-label={error ? undefined : 'Loading the picture'}>
          {error && 'This picture could not be loaded.'}
        </Box>
      )}
    </SheetRow>
  );
}
