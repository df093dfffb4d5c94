import { Box } from '@chakra-ui/react';
import type { ReportResponse } from '@thudline/contracts';
import { useMemo, useState } from 'react';
import { HeaderLine } from '../../../components/HeaderLine';
import { Headline } from '../../../components/Headline';
import { clock, plural } from '../../../lib/format';
import { MarginNote, SheetRow } from '../../sheet/components/RuledSheet';
import { levelTopics } from '../../sheet/components/sectionWords';
import { LineWords } from '../../sheet/components/TakeLine';
import { useReport } from '../../sheet/hooks/useReport';
import { kickHitsOf, loudestHit, nearestHit } from '../../sheet/kickHits';
import { HitStrip } from '../../sheet/pictures/HitStrip';
import { LiveBench } from './LiveBench';
import { LiveFinding } from './LiveFinding';
import { LiveSheetLoading } from './LiveSheetLoading';

/** The heart of a real sheet, to play and flip without an account; where it can't be had the page ends earlier. */
export function LiveSheet({ takeId }: { takeId: string }) {
  const { report, error } = useReport(takeId, true);
  if (error) return null;
  if (!report) return <LiveSheetLoading />;
  return <LoadedSheet report={report} />;
}

function LoadedSheet({ report }: { report: ReportResponse }) {
  const kickHits = useMemo(() => kickHitsOf(report), [report]);
  const [chosenHit, setChosenHit] = useState(() => loudestHit(report, kickHits));
  return (
    <Box as="section" aria-label="A sheet we made earlier" marginTop="28px">
      <SheetRow>
        <HeaderLine />
        <Box color="ink.muted" fontSize="small" lineHeight="22px" marginTop="21px">
          A sheet we made earlier · {plural(kickHits.length, 'kick hit')}, {clock(report.durationS)}
        </Box>
      </SheetRow>
      <SheetRow
        note={
          <MarginNote from="the line">What to do, in the order that matters. The rest says why.</MarginNote>
        }
      >
        <Headline
          as="h2"
          fontSize={{ base: '24px', lg: '28px' }}
          lineHeight={{ base: '29px', lg: '33px' }}
          marginTop="4px"
        >
          <LineWords line={report.line} />
        </Headline>
      </SheetRow>
      <SheetRow
        note={
          <Box marginTop={{ lg: '48px' }}>
            <MarginNote from="levels">
              A dot is a hit. The hardest belongs at the aim; the arrow is how far to turn.
            </MarginNote>
          </Box>
        }
      >
        <LiveFinding report={report} topics={levelTopics} />
        <HitStrip
          report={report}
          chosenHit={chosenHit}
          onChoose={(index) => setChosenHit(nearestHit(report, kickHits, index))}
        />
      </SheetRow>
      {report.pairSpectrum && chosenHit !== null && (
        <LiveBench {...{ report, kickHits, chosenHit }} onChooseHit={setChosenHit} />
      )}
    </Box>
  );
}
