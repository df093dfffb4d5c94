import { Box } from '@chakra-ui/react';
import type { MeResponse, TryOutRankingResponse, TryOutResponse } from '@thudline/contracts';
import { useMemo, useState } from 'react';
import { KeysDialog } from '../../sheet/components/KeysDialog';
import { RuledSheet, SheetRow } from '../../sheet/components/RuledSheet';
import { headline } from '../headline';
import { heardPlaces, shuffled } from '../hearing';
import { useHearAll } from '../hooks/useHearAll';
import { tryOutKeyWords, useHearKeys } from '../hooks/useHearKeys';
import type { RankBy } from '../hooks/useTryOutRanking';
import { shortPosition, unitWord } from '../positionWords';
import { placeName, rankedPlaces } from '../rows';
import { HearRow, type HeardChoice } from './HearRow';
import { HiddenChoice } from './HiddenChoice';
import { CymbalsNote, ListeningNote } from './MarginNotes';
import { MeasuringPlaces } from './MeasuringPlaces';
import { PlotSection } from './PlotSection';
import { RankedTable } from './RankedTable';
import { RankSentence } from './RankSentence';
import { TryOutHead } from './TryOutHead';
import { UnsentPlaces } from './UnsentPlaces';
import { WinnerForm } from './WinnerForm';

interface TryOutSheetProps {
  tryOut: TryOutResponse;
  ranking: TryOutRankingResponse;
  by: RankBy;
  onRankBy: (by: RankBy) => void;
  me: MeResponse;
}

/** A try-out as a sheet: the line, the plot, all takes to hear in step, the ranking, the winner. */
export function TryOutSheet({ tryOut, ranking, by, onRankBy, me }: TryOutSheetProps) {
  const { lengthUnit, singleKeys } = me.settings;
  const [order, setOrder] = useState<readonly string[] | null>(null);
  const [chosenId, setChosenId] = useState<string | null>(null);
  const [help, setHelp] = useState(false);
  const ranked = rankedPlaces(tryOut, ranking);
  const heard = useMemo(() => heardPlaces(tryOut, ranking.rows), [tryOut, ranking]);
  const hearing = useHearAll(heard);
  const hidden = order !== null;
  const placeIds = order ?? heard.map(({ placeId }) => placeId);
  useHearKeys({ singleKeys, hearing, placeIds, onHelp: () => setHelp(true) });
  const best = ranked.find(({ row }) => row.standing === 'best');
  const winnerId = chosenId ?? tryOut.winnerPlaceId ?? best?.place.id ?? null;
  const winner = tryOut.places.find(({ id }) => id === winnerId);
  const hideWords = tryOut.subject === 'overhead-height' ? 'the heights' : 'which is which';
  const choices = placeIds.flatMap((placeId, index): HeardChoice[] => {
    const place = tryOut.places.find(({ id }) => id === placeId);
    if (!place?.take) return [];
    if (hidden) return [{ placeId, word: letter(index), label: letter(index) }];
    const word = shortPosition(place, tryOut.unit, lengthUnit) ?? String(place.take.number);
    return [{ placeId, word, label: `take ${place.take.number}, ${placeName(place, tryOut, lengthUnit)}` }];
  });
  const hide = (hiding: boolean) => {
    hearing.stop();
    setOrder(
      hiding
        ? shuffled(
            heard.map(({ placeId }) => placeId),
            Math.random,
          )
        : null,
    );
  };
  const shown = { tryOut, ranking, ranked, lengthUnit };
  return (
    <RuledSheet>
      <SheetRow>
        <TryOutHead
          tryOut={tryOut}
          words={hidden ? { strong: 'Which one is it?', rest: 'Listen, then choose.' } : headline(shown)}
        />
        <MeasuringPlaces tryOut={tryOut} />
        <UnsentPlaces tryOut={tryOut} mayChange={!me.readOnly} />
        {!hidden && ranked.length > 0 && <RankSentence by={by} onChange={onRankBy} />}
        {!hidden && <PlotSection {...shown} />}
      </SheetRow>
      {choices.length > 0 && (
        <SheetRow note={<ListeningNote turnedDownDb={hearing.turnedDownDb} hideWords={hideWords} />}>
          <HearRow
            {...{ hearing, choices, hidden, hideWords }}
            unit={unitWord(tryOut.unit, lengthUnit)}
            onHide={hide}
          />
        </SheetRow>
      )}
      {hidden ? (
        <SheetRow>
          <HiddenChoice
            choices={choices}
            onChoose={(placeId) => {
              setChosenId(placeId);
              hide(false);
            }}
          />
        </SheetRow>
      ) : (
        ranked.length > 0 && (
          <SheetRow
            note={
              <Box marginTop={{ lg: '50px' }}>
                <CymbalsNote {...shown} />
              </Box>
            }
          >
            <RankedTable {...shown} winnerId={winnerId} onChoose={me.readOnly ? undefined : setChosenId} />
            {winner && !me.readOnly && (
              <WinnerForm
                tryOut={tryOut}
                winnerId={winner.id}
                winnerName={placeName(winner, tryOut, lengthUnit)}
              />
            )}
          </SheetRow>
        )
      )}
      {help && <KeysDialog keys={tryOutKeyWords} onClose={() => setHelp(false)} />}
    </RuledSheet>
  );
}

const letter = (index: number) => String.fromCharCode('A'.charCodeAt(0) + index);
