import { Box } from '@chakra-ui/react';
import type { ReportResponse } from '@thudline/contracts';
import type { PairSpectrum } from '@thudline/dsp';
import { useState } from 'react';
import { TextButton } from '../../../components/Button';
import type { Bench } from '../hooks/useChoice';
import { useFollowHit } from '../hooks/useFollowHit';
import { useHitExcerpt } from '../hooks/useHitExcerpt';
import { useSheetKeys } from '../hooks/useSheetKeys';
import type { Listening } from '../hooks/useListening';
import type { usePairSpectrum } from '../hooks/usePairSpectrum';
import type { TraceBand } from '../pictures/pairTraceLayout';
import { WhereItHelps } from '../pictures/WhereItHelps';
import { BenchLoading } from './BenchLoading';
import { ChoiceFigures } from './ChoiceFigures';
import { ChoiceRow } from './ChoiceRow';
import { ChoiceSentence } from './ChoiceSentence';
import { HitTrace } from './HitTrace';
import { KeysDialog } from './KeysDialog';
import { LowEndOfChoices } from './LowEndOfChoices';
import { PictureTitle } from './SheetSection';
import { WhereKey } from './WhereKey';

export interface PairBenchProps {
  report: ReportResponse;
  pair: ReturnType<typeof usePairSpectrum>;
  bench: Bench;
  listening: Listening;
  /** Indexes of the kick hits in the report's hits. */
  kickHits: number[];
  chosenHit: number;
  onChooseHit: (hitIndex: number) => void;
  /** Whether single keys act. */
  singleKeys: boolean;
  /** Without it there is nothing to hear, nor the samples of a hit to look at. */
  canListen: boolean;
}

/** Where choices are looked at and heard: everything below follows the one that is chosen. */
export function PairBench(props: PairBenchProps) {
  const { spectrum, error, retry } = props.pair;
  if (error)
    return (
      <Box role="alert" marginTop="14px">
        The pictures could not be loaded. {error.message}{' '}
        <TextButton fontWeight={600} onClick={retry}>
          Try again
        </TextButton>
      </Box>
    );
  if (!spectrum) return <BenchLoading />;
  return <LoadedBench {...props} spectrum={spectrum} />;
}

function LoadedBench({ spectrum, ...props }: PairBenchProps & { spectrum: PairSpectrum }) {
  const { report, bench, kickHits, chosenHit, canListen } = props;
  const { chosen, asRecorded } = bench;
  const hitExcerpt = useHitExcerpt(report, chosenHit, canListen);
  useFollowHit(props.listening, hitExcerpt.excerpt);
  const [band, setBand] = useState<TraceBand>('low');
  const hitNumber = kickHits.indexOf(chosenHit) + 1;
  const [helping, setHelping] = useState(false);
  useSheetKeys({ ...props, excerpt: hitExcerpt.excerpt, onHelp: () => setHelping(true) });
  return (
    <>
      <ChoiceRow {...props} hitExcerpt={hitExcerpt} hitNumber={hitNumber} />
      <ChoiceSentence bench={bench} sampleRateHz={report.sampleRateHz} temperatureC={report.temperatureC} />
      <PictureTitle>Low end of the two added</PictureTitle>
      <LowEndOfChoices spectrum={spectrum} bench={bench} />
      {canListen && (
        <HitTrace
          {...{ report, chosen, hitExcerpt, hitNumber, band, setBand, hitS: report.hits[chosenHit].timeS }}
        />
      )}
      <ChoiceFigures {...{ spectrum, asRecorded, chosen }} excerpt={hitExcerpt.excerpt} />
      <PictureTitle>Where it helps, from low to high</PictureTitle>
      <WhereItHelps {...{ spectrum, asRecorded, chosen }} />
      <WhereKey {...{ spectrum, asRecorded, chosen }} />
      {helping && <KeysDialog onClose={() => setHelping(false)} />}
    </>
  );
}
