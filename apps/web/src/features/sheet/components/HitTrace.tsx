import { Box, Flex, chakra } from '@chakra-ui/react';
import type { ReportResponse } from '@thudline/contracts';
import type { ReactNode } from 'react';
import { TextButton } from '../../../components/Button';
import type { NamedChoice } from '../hooks/choiceNames';
import type { useHitExcerpt } from '../hooks/useHitExcerpt';
import { ink, lineOnPaper } from '../pictures/ink';
import { PairTrace } from '../pictures/PairTrace';
import type { TraceBand } from '../pictures/pairTraceLayout';
import { PictureTitle } from './SheetSection';

interface HitTraceProps {
  report: ReportResponse;
  chosen: NamedChoice;
  hitExcerpt: ReturnType<typeof useHitExcerpt>;
  hitNumber: number;
  hitS: number;
  band: TraceBand;
  setBand: (band: TraceBand) => void;
}

/** The pair trace with its title, its key and the switch between low end and every frequency. */
export function HitTrace({ report, chosen, hitExcerpt, hitNumber, hitS, band, setBand }: HitTraceProps) {
  const { excerpt, error, retry } = hitExcerpt;
  return (
    <>
      <PictureTitle>
        Hit {hitNumber}, {band === 'low' ? 'low end only' : 'every frequency'}
      </PictureTitle>
      <TraceKey chosen={chosen} band={band} setBand={setBand} />
      {error ? (
        <Box role="alert" minHeight="282px" paddingTop="20px">
          This hit could not be loaded. {error.message}{' '}
          <TextButton fontWeight={600} onClick={retry}>
            Try again
          </TextButton>
        </Box>
      ) : excerpt ? (
        <PairTrace {...{ excerpt, hitS, band, choice: chosen, arrivalMs: report.arrival.arrivalMs }} />
      ) : (
        <Box height="282px" role="status" aria-label="Loading this hit" />
      )}
    </>
  );
}

function TraceKey({ chosen, band, setBand }: Pick<HitTraceProps, 'chosen' | 'band' | 'setBand'>) {
  const overhead = chosen.label === 'as recorded' ? 'overhead' : `overhead, ${chosen.label}`;
  return (
    <Flex
      fontSize="caption"
      color="ink.muted"
      columnGap="20px"
      rowGap="4px"
      wrap="wrap"
      marginTop="6px"
      alignItems="center"
    >
      <KeyEntry mark={<chakra.path d="M0 6h26" stroke={ink.kick} strokeWidth="3px" />}>kick</KeyEntry>
      <KeyEntry
        mark={
          <chakra.path
            d="M0 6h26"
            stroke={ink.overhead}
            strokeWidth={{ base: '2px', _print: lineOnPaper.overhead }}
            strokeDasharray={chosen.flipped ? '7 3' : undefined}
          />
        }
      >
        {overhead}
      </KeyEntry>
      <KeyEntry mark={<rect x="3" width="20" height="12" fill={ink.together} />}>push together</KeyEntry>
      <KeyEntry mark={<path d="M4 12 14 0M11 12 21 0M18 12 26 2.5" stroke={ink.hatch} strokeWidth="1.4" />}>
        pull apart
      </KeyEntry>
      <TextButton marginLeft={{ lg: 'auto' }} onClick={() => setBand(band === 'low' ? 'every' : 'low')}>
        {band === 'low' ? 'show every frequency' : 'show the low end only'}
      </TextButton>
    </Flex>
  );
}

export function KeyEntry({ mark, children }: { mark: ReactNode; children: ReactNode }) {
  return (
    <chakra.span display="inline-flex" gap="6px" alignItems="center">
      <svg width="26" height="12" aria-hidden>
        {mark}
      </svg>
      {children}
    </chakra.span>
  );
}
