import type { MeResponse, TryOutRankingResponse, TryOutResponse } from '@thudline/contracts';
import { useMemo, useState, type ReactNode } from 'react';
import { KeysDialog } from '../../sheet/components/KeysDialog';
import { RuledSheet, SheetRow } from '../../sheet/components/RuledSheet';
import { headline } from '../headline';
import { heardPlaces } from '../hearing';
import { useBlindChoice } from '../hooks/useBlindChoice';
import { useHearAll } from '../hooks/useHearAll';
import { tryOutKeyWords, useHearKeys } from '../hooks/useHearKeys';
import type { RankBy } from '../hooks/useTryOutRanking';
import { unitWord } from '../positionWords';
import { rankedPlaces } from '../rows';
import { ChangeTakes } from './ChangeTakes';
import { HearRow } from './HearRow';
import { HiddenChoice } from './HiddenChoice';
import { ListeningNote } from './MarginNotes';
import { MeasuringPlaces } from './MeasuringPlaces';
import { PlotSection } from './PlotSection';
import { RankingSection } from './RankingSection';
import { RankSentence } from './RankSentence';
import { TryOutHead } from './TryOutHead';
import { UnsentPlaces } from './UnsentPlaces';

interface TryOutSheetProps {
  tryOut: TryOutResponse;
  ranking: TryOutRankingResponse;
  by: RankBy;
  onRankBy: (by: RankBy) => void;
  me: Pick<MeResponse, 'settings' | 'readOnly'>;
  /** Stands above the line: what a guest is asked. */
  above?: ReactNode;
  /** At the head of the margin: sending the try-out. */
  marginHead?: ReactNode;
  canListen?: boolean;
}

const hiddenLine = { strong: 'Which one is it?', rest: 'Listen, then choose.' };

/** A try-out as a sheet: the line, the plot, all takes to hear in step, the ranking, the winner. */
export function TryOutSheet({
  tryOut,
  ranking,
  by,
  onRankBy,
  me,
  canListen = true,
  ...slots
}: TryOutSheetProps) {
  const { lengthUnit, singleKeys } = me.settings;
  const [chosenId, setChosenId] = useState<string | null>(null);
  const [help, setHelp] = useState(false);
  const ranked = rankedPlaces(tryOut, ranking);
  const heard = useMemo(() => heardPlaces(tryOut, ranking.rows), [tryOut, ranking]);
  const hearing = useHearAll(heard);
  const { hidden, choices, placeIds, hide, hideWords } = useBlindChoice(tryOut, heard, lengthUnit);
  useHearKeys({ singleKeys, hearing, placeIds, onHelp: () => setHelp(true) });
  const shown = { tryOut, ranking, ranked, lengthUnit };
  const reveal = (placeId: string) => {
    hearing.stop();
    setChosenId(placeId);
    hide(false);
  };
  return (
    <RuledSheet>
      <SheetRow note={slots.marginHead}>
        {slots.above}
        <TryOutHead tryOut={tryOut} words={hidden ? hiddenLine : headline(shown)} />
        <MeasuringPlaces tryOut={tryOut} />
        <UnsentPlaces tryOut={tryOut} mayChange={!me.readOnly} />
        {!hidden && ranked.length > 0 && <RankSentence by={by} onChange={onRankBy} />}
        {!hidden && <PlotSection {...shown} />}
      </SheetRow>
      {canListen && choices.length > 0 && (
        <SheetRow note={<ListeningNote turnedDownDb={hearing.turnedDownDb} hideWords={hideWords} />}>
          <HearRow
            {...{ hearing, choices, hidden, hideWords }}
            unit={unitWord(tryOut.unit, lengthUnit)}
            onHide={(hiding) => {
              hearing.stop();
              hide(hiding);
            }}
          />
          {hidden && <HiddenChoice choices={choices} onChoose={reveal} />}
        </SheetRow>
      )}
      {!hidden && ranked.length > 0 && (
        <RankingSection {...shown} chosenId={chosenId} onChoose={me.readOnly ? undefined : setChosenId} />
      )}
      {!hidden && !me.readOnly && (
        <SheetRow>
          <ChangeTakes tryOut={tryOut} lengthUnit={lengthUnit} />
        </SheetRow>
      )}
      {help && <KeysDialog keys={tryOutKeyWords} onClose={() => setHelp(false)} />}
    </RuledSheet>
  );
}
