import { Box, Flex, chakra } from '@chakra-ui/react';
import type { ReportResponse } from '@thudline/contracts';
import { useState } from 'react';
import { TextButton } from '../../../components/Button';
import { KeyEntry } from '../../sheet/components/HitTrace';
import { useHitExcerpt } from '../../sheet/hooks/useHitExcerpt';
import { ink, lineOnPaper } from '../../sheet/pictures/ink';
import type { TraceBand } from '../../sheet/pictures/pairTraceLayout';
import type { SameHitChoice } from '../hooks/useSameHit';
import { TwoTraces } from '../pictures/TwoTraces';

interface SameHitProps {
  reports: readonly [ReportResponse, ReportResponse];
  names: readonly [string, string];
  sameHit: SameHitChoice;
}

/** The same kick hit of both takes: both microphones of each, on one time base. */
export function SameHit({ reports, names, sameHit }: SameHitProps) {
  const [band, setBand] = useState<TraceBand>('low');
  const [before, after] = [
    useHitExcerpt(reports[0], sameHit.hitsAt[0]),
    useHitExcerpt(reports[1], sameHit.hitsAt[1]),
  ];
  const failed = before.error ? before : after.error ? after : null;
  return (
    <>
      <TracesKey band={band} setBand={setBand} />
      {failed ? (
        <Box role="alert" minHeight="290px" paddingTop="20px">
          This hit could not be loaded. {failed.error?.message}{' '}
          <TextButton fontWeight={600} onClick={failed.retry}>
            Try again
          </TextButton>
        </Box>
      ) : before.excerpt && after.excerpt ? (
        <TwoTraces
          band={band}
          takes={[
            traceTake(reports[0], before.excerpt, sameHit.hitsAt[0], names[0]),
            traceTake(reports[1], after.excerpt, sameHit.hitsAt[1], names[1]),
          ]}
        />
      ) : (
        <Box height="298px" role="status" aria-label="Loading this hit" />
      )}
    </>
  );

  function traceTake(
    report: ReportResponse,
    excerpt: NonNullable<typeof before.excerpt>,
    hit: number,
    name: string,
  ) {
    return { report, excerpt, hitS: report.hits[hit].timeS, label: `${name}, hit ${sameHit.place + 1}` };
  }
}

function TracesKey({ band, setBand }: { band: TraceBand; setBand: (band: TraceBand) => void }) {
  return (
    <Flex
      fontSize="caption"
      color="ink.muted"
      columnGap="20px"
      rowGap="4px"
      wrap="wrap"
      marginTop="4px"
      alignItems="center"
    >
      <KeyEntry mark={<chakra.path d="M0 6h26" stroke={ink.kick} strokeWidth="3px" />}>kick</KeyEntry>
      <KeyEntry
        mark={
          <chakra.path
            d="M0 6h26"
            stroke={ink.overhead}
            strokeWidth={{ base: '2px', _print: lineOnPaper.overhead }}
          />
        }
      >
        overhead
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
