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
import { BothSpectra } from './BothSpectra';
import { CompareHead } from './CompareHead';
import { HearBoth } from './HearBoth';
import { SameHit } from './SameHit';
import { WhatChanged } from './WhatChanged';
import { WhatDiffered } from './WhatDiffered';
import { WhatEachSays } from './WhatEachSays';

export interface ComparedTakesProps {
  comparison: ComparisonResponse;
  before: ReportResponse;
  after: ReportResponse;
  /** Of the reader: keys. */
  settings: UserSettings;
}

/** Two takes compared, top to bottom. */
export function ComparedTakes({ comparison, before, after, settings }: ComparedTakesProps) {
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
  const names = [`take ${comparison.before.number}`, `take ${comparison.after.number}`] as const;
  return (
    <RuledSheet>
      <SheetRow note={<Caveats comparison={comparison} about={(about) => about === 'the flip'} />}>
        <CompareHead before={comparison.before} after={comparison.after} />
        <Headline marginTop="8px">
          <LineWords line={comparison.line} />
        </Headline>
        <WhatDiffered {...comparison} />
      </SheetRow>
      <Section title="What each take says">
        <WhatEachSays {...{ comparison, reports }} />
      </Section>
      <Section
        title="What changed, and how surely"
        note={<Caveats comparison={comparison} about={(about) => about !== 'the flip'} />}
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

function Section({ title, note, children }: { title: string; note?: ReactNode; children: ReactNode }) {
  return (
    <Box as="section" aria-label={title} marginTop={{ base: '26px', _print: '20px' }}>
      <SheetRow note={note}>
        <chakra.h2 fontSize={{ base: '22px', lg: 'section' }} fontWeight={900} lineHeight="30px">
          {title}
        </chakra.h2>
        {children}
      </SheetRow>
    </Box>
  );
}

/** Cautions about the comparison itself, beside what they speak of. */
function Caveats({
  comparison,
  about,
}: {
  comparison: ComparisonResponse;
  about: (about: string) => boolean;
}) {
  return comparison.caveats
    .filter((caveat) => about(caveat.about))
    .map((caveat) => (
      <MarginNote key={caveat.about} from="Thudline" about={caveat.about}>
        {caveat.text}
      </MarginNote>
    ));
}
