import { Box } from '@chakra-ui/react';
import type { ReportResponse } from '@thudline/contracts';
import { BalanceLine } from '../pictures/BalanceLine';
import { Findings } from './Findings';
import { MarginNote } from './RuledSheet';
import { balanceTopics, balanceWord, findingsOf, worstStatus } from './sectionWords';
import { SheetSection } from './SheetSection';

/** Drums and cymbals: how the one overhead holds them against each other. Not there for a take measured before it was. */
export function DrumsSection({ report }: { report: ReportResponse }) {
  const { balance } = report;
  if (!balance) return null;
  const findings = findingsOf(report, balanceTopics);
  return (
    <SheetSection
      id="drums"
      title="Drums and cymbals"
      word={balanceWord(balance)}
      status={worstStatus(findings)}
      note={
        <MarginNote from="Thudline" about="drums and cymbals">
          From {balance.drumHits} drum and {balance.cymbalHits} cymbal hits that stand alone, kicks left out.
          3 dB is common practice, not a standard.
        </MarginNote>
      }
    >
      <Findings findings={findings} />
      {balance.differenceDb !== null && (
        <Box _print={{ display: 'none' }}>
          <BalanceLine differenceDb={balance.differenceDb} />
        </Box>
      )}
    </SheetSection>
  );
}
