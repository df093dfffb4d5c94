import type { ReportResponse, TakeResponse, UserSettings } from '@thudline/contracts';
import { Suspense, useMemo, useState, type ComponentType, type ReactNode } from 'react';
import { useChoice } from '../hooks/useChoice';
import { useListening } from '../hooks/useListening';
import { usePairSpectrum } from '../hooks/usePairSpectrum';
import { kickHitsOf, loudestHit, nearestHit } from '../kickHits';
import { NotePlace, NotePlacesProvider, useNotePlaces, type SheetNotesProps } from '../notePlaces';
import { AddingUpSection } from './AddingUpSection';
import { DrumsSection } from './DrumsSection';
import { FiguresSection } from './FiguresSection';
import { LevelsSection } from './LevelsSection';
import { RoomSection } from './RoomSection';
import { RuledSheet } from './RuledSheet';
import { SheetTop } from './SheetTop';
import { WholeTakeSection } from './WholeTakeSection';

export interface MeasuredSheetProps {
  /** `take.rights` says what the reader may do: without `change` nothing on the sheet writes. */
  take: TakeResponse;
  report: ReportResponse;
  /** Of the reader: units and keys. */
  settings: UserSettings;
  /** Stands above the line: what a guest is asked. */
  above?: ReactNode;
  /** At the head of the margin: sending the sheet. */
  marginHead?: ReactNode;
  /** Beside "Add the next take": Big print, show on my phone. */
  moreButtons?: ReactNode;
  /** What people write on the sheet; loaded after it can be read. */
  Notes?: ComponentType<SheetNotesProps>;
}

/** The sheet of a measured take, top to bottom. The chosen hit and the choice are one for the whole sheet. */
export function MeasuredSheet({ take, report, settings, Notes, ...slots }: MeasuredSheetProps) {
  const kickHits = useMemo(() => kickHitsOf(report), [report]);
  const [chosen, setChosenHit] = useState(() => loudestHit(report, kickHits));
  // Another version of the measurements may find other hits, while this sheet is open.
  const chosenHit = chosen !== null && kickHits.includes(chosen) ? chosen : loudestHit(report, kickHits);
  const pair = usePairSpectrum(report);
  const bench = useChoice(report.agreement);
  const listening = useListening({ report, spectrum: pair.spectrum, bench });
  const { places, register } = useNotePlaces();
  return (
    <NotePlacesProvider value={Notes ? register : null}>
      <RuledSheet>
        <SheetTop {...{ take, report, listening }} {...slots} />
        <LevelsSection
          report={report}
          chosenHit={chosenHit}
          onChooseHit={(index) => setChosenHit(nearestHit(report, kickHits, index))}
        />
        <AddingUpSection
          {...{ take, report, pair, bench, listening, kickHits, chosenHit }}
          singleKeys={settings.singleKeys}
          canListen={take.rights.listen}
          onChooseHit={setChosenHit}
        />
        <DrumsSection report={report} />
        <RoomSection report={report} />
        <WholeTakeSection {...{ report, listening, chosenHit }} canListen={take.rights.listen} />
        <FiguresSection {...{ take, report, settings }} />
        <NotePlace name="notes" />
        {Notes && (
          <Suspense>
            <Notes {...{ take, report, settings, listening, chosenHit, places }} />
          </Suspense>
        )}
      </RuledSheet>
    </NotePlacesProvider>
  );
}
