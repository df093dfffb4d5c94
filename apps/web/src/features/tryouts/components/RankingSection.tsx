import { Box } from '@chakra-ui/react';
import type { TryOutRankingResponse, TryOutResponse } from '@thudline/contracts';
import { SheetRow } from '../../sheet/components/RuledSheet';
import type { LengthUnit } from '../positionWords';
import { placeName, type RankedPlace } from '../rows';
import { CymbalsNote } from './MarginNotes';
import { RankedTable } from './RankedTable';
import { WinnerForm } from './WinnerForm';

interface RankingSectionProps {
  tryOut: TryOutResponse;
  ranking: TryOutRankingResponse;
  ranked: readonly RankedPlace[];
  lengthUnit: LengthUnit;
  /** The winner as it is chosen here, kept or not yet. */
  chosenId: string | null;
  /** Absent for whoever may only read. */
  onChoose?: (placeId: string) => void;
}

/** The takes by rank, and what the winner becomes. */
export function RankingSection({ chosenId, onChoose, ...shown }: RankingSectionProps) {
  const { tryOut, ranked, lengthUnit } = shown;
  const best = ranked.find(({ row }) => row.standing === 'best');
  const winnerId = chosenId ?? tryOut.winnerPlaceId ?? best?.place.id ?? null;
  const winner = tryOut.places.find(({ id }) => id === winnerId);
  return (
    <SheetRow
      note={
        <Box marginTop={{ lg: '50px' }}>
          <CymbalsNote {...shown} />
        </Box>
      }
    >
      <RankedTable {...shown} winnerId={winnerId} onChoose={onChoose} />
      {winner && onChoose && (
        <WinnerForm tryOut={tryOut} winnerId={winner.id} winnerName={placeName(winner, tryOut, lengthUnit)} />
      )}
    </SheetRow>
  );
}
