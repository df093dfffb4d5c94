import { Box, chakra } from '@chakra-ui/react';
import type { ReportResponse } from '@thudline/contracts';
import { lazy, Suspense } from 'react';
import { TextButton } from '../../../components/Button';
import { plural } from '../../../lib/format';
import type { Listening } from '../hooks/useListening';
import { usePeaks } from '../hooks/usePeaks';
import { NotePlace } from '../notePlaces';
import { SectionText, SheetSection } from './SheetSection';

const WholeTake = lazy(async () => ({ default: (await import('../pictures/WholeTake')).WholeTake }));
const pictureHeight = '226px';

/** The whole take: both outlines on one time axis, with the hits, what clipped, and where it plays. */
export function WholeTakeSection({
  report,
  listening,
  chosenHit,
  canListen,
}: {
  report: ReportResponse;
  listening: Listening;
  chosenHit: number | null;
  canListen: boolean;
}) {
  const { peaks, error, retry } = usePeaks(report.takeId);
  const kicks = report.hits.filter((hit) => hit.kind === 'kick').length;
  return (
    <SheetSection id="whole-take" title="Whole take">
      <SectionText>
        {plural(kicks, 'kick hit')} among {plural(report.hits.length, 'hit')}.{' '}
        {canListen && (
          <chakra.span _print={{ display: 'none' }}>Click or drag to choose where it plays. </chakra.span>
        )}
        Each microphone is drawn to its own peak.
        <NotePlace as="span" name="mark:whole-take" />
      </SectionText>
      {error ? (
        <Box role="alert" minHeight={pictureHeight} paddingTop="14px">
          The outlines could not be loaded. {error.message}{' '}
          <TextButton fontWeight={600} onClick={retry}>
            Try again
          </TextButton>
        </Box>
      ) : (
        <Suspense fallback={<Box height={pictureHeight} />}>
          {peaks ? (
            <WholeTake {...{ report, peaks, listening, chosenHit, canListen }} />
          ) : (
            <Box height={pictureHeight} role="status" aria-label="Loading the outlines" />
          )}
        </Suspense>
      )}
    </SheetSection>
  );
}
