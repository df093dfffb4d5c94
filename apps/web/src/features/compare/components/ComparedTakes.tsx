import { Box, chakra } from '@chakra-ui/react';
import type { ComparisonResponse, ReportResponse, UserSettings } from '@thudline/contracts';
import { useMemo, useState, type ReactNode } from 'react';
import { Headline } from '../../../components/Headline';
import { KeysDialog } from '../../sheet/components/KeysDialog';
import { MarginNote, RuledSheet, SheetRow } from '../../sheet/components/RuledSheet';
import { LineWords } from '../../sheet/components/TakeLine';
import { compareKeyWords, useCompareKeys } from '../hooks/useCompareKeys';
import { useSameHit } from '../hooks/useSameHit';
import { useTwoTakes } from '../hooks/useTwoTakes';
import { letteredCaveats, lettersOf, type LetteredCaveat } from '../letteredCaveats';
import { BothSpectra } from './BothSpectra';
import { CompareHead } from './CompareHead';
import { HearBoth } from './HearBoth';
import { Letters } from './Letters';
import { SameHit } from './SameHit';
import { SentHead } from './SentHead';
import { WhatChanged } from './WhatChanged';
import { WhatDiffered } from './WhatDiffered';
import { WhatEachSays } from './WhatEachSays';

export interface ComparedTakesProps {
  comparison: ComparisonResponse;
  before: ReportResponse;
  after: ReportResponse;
  /** Of the reader: keys. */
  settings: UserSettings;
  /** Stands above the line: what a guest is asked. */
  above?: ReactNode;
  /** At the head of the margin: sending the comparison. */
  marginHead?: ReactNode;
  /** Whether it was sent to the reader: these two takes and no others. */
  sent?: boolean;
}

/** Two takes compared, top to bottom. */
export function ComparedTakes({ comparison, before, after, settings, ...slots }: ComparedTakesProps) {
  const reports = useMemo(() => [before, after] as const, [before, after]);
  const listening = useTwoTakes(reports);
  const sameHit = useSameHit(reports, listening.time);
  const [helping, setHelping] = useState(false);
  const canListen = comparison.before.canListen && comparison.after.canListen;
  useCompareKeys({
    singleKeys: settings.singleKeys,
    listening: canListen ? listening : null,
    playFromHit: () => listening.play(sameHit.startS),
    stepHit: sameHit.step,
    onHelp: () => setHelping(true),
  });
  const { ofFlip, ofFigures } = letteredCaveats(comparison.caveats);
  const names = [`take ${comparison.before.number}`, `take ${comparison.after.number}`] as const;
  return (
    <RuledSheet>
      <SheetRow
        note={
          <>
            {slots.marginHead}
            <Caveats caveats={ofFlip} />
          </>
        }
      >
        {slots.above}
        {slots.sent ? <SentHead {...comparison} /> : <CompareHead {...comparison} />}
        <Headline marginTop="8px">
          <LineWords line={comparison.line} />
        </Headline>
        <WhatDiffered {...comparison} letters={lettersOf(ofFlip)} />
      </SheetRow>
      <Section title="What each take says">
        <WhatEachSays {...{ comparison, reports }} />
      </Section>
      <Section
        title="What changed, and how surely"
        letters={lettersOf(ofFigures)}
        note={<Caveats caveats={ofFigures} />}
      >
        <WhatChanged {...comparison} />
      </Section>
      {canListen && (
        <Section title={sameHit.count > 0 ? 'The same hit in both' : 'Hear both'}>
          {sameHit.count > 0 && <SameHit {...{ reports, names, sameHit }} />}
          <HearBoth {...{ reports, names, listening, sameHit }} />
        </Section>
      )}
      <Section title="How they add up">
        <BothSpectra {...{ reports, names }} polarity={comparison.polarity} />
      </Section>
      {helping && <KeysDialog keys={compareKeyWords} onClose={() => setHelping(false)} />}
    </RuledSheet>
  );
}

interface SectionProps {
  title: string;
  /** Of the notes beside it. */
  letters?: readonly string[];
  note?: ReactNode;
  children: ReactNode;
}

function Section({ title, letters = [], note, children }: SectionProps) {
  return (
    <Box as="section" aria-label={title} marginTop={{ base: '26px', _print: '20px' }}>
      <SheetRow note={note}>
        <chakra.h2 fontSize={{ base: '22px', lg: 'section' }} fontWeight={900} lineHeight="30px">
          {title} <Letters letters={letters} />
        </chakra.h2>
        {children}
      </SheetRow>
    </Box>
  );
}

/** Cautions about the comparison itself, lettered in their order, beside what they speak of. */
function Caveats({ caveats }: { caveats: readonly LetteredCaveat[] }) {
  return caveats.map(({ letter, about, text }) => (
    <MarginNote key={about} from={`${letter} Thudline`} about={about}>
      {text}
    </MarginNote>
  ));
}
