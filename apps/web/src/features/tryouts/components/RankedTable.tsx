import { Box, chakra } from '@chakra-ui/react';
import { Lettered } from '../../../components/Lettered';
import type { TryOutRankingResponse, TryOutResponse } from '@thudline/contracts';
import { rankingWords, shortValue } from '../measureWords';
import type { LengthUnit } from '../positionWords';
import type { RankedPlace } from '../rows';
import { subjectWords } from '../subjectWords';
import { valueAxis, type ValueAxis } from '../valueAxis';
import { onDesk, rankedGrid } from './rankedGrid';
import { RankedRow } from './RankedRow';

interface RankedTableProps {
  tryOut: TryOutResponse;
  ranking: TryOutRankingResponse;
  ranked: readonly RankedPlace[];
  lengthUnit: LengthUnit;
  /** The place chosen as the winner; null for none yet. */
  winnerId: string | null;
  /** Absent for whoever may only read. */
  onChoose?: (placeId: string) => void;
}

/** The takes by rank: figure with its interval, against the first, cymbals beside it, and who wins. */
export function RankedTable({ tryOut, ranking, ranked, lengthUnit, winnerId, onChoose }: RankedTableProps) {
  const words = rankingWords(ranking);
  const axis = valueAxis(ranked, words.zero !== null);
  return (
    <Box role="table" aria-label="The takes, best first" marginTop="22px">
      <HeadRow {...{ tryOut, ranking, axis }} />
      <Box role="rowgroup">
        {ranked.map((of) => (
          <RankedRow
            key={of.place.id}
            {...{ of, axis, tryOut, ranking, lengthUnit }}
            wins={winnerId === of.place.id}
            onChoose={onChoose && (() => onChoose(of.place.id))}
          />
        ))}
      </Box>
    </Box>
  );
}

function HeadRow({
  tryOut,
  ranking,
  axis,
}: Pick<RankedTableProps, 'tryOut' | 'ranking'> & { axis: ValueAxis }) {
  return (
    <Box
      role="row"
      {...rankedGrid}
      alignItems="end"
      paddingBottom="5px"
      borderBottom="1px solid"
      borderColor="rule"
      fontSize="caption"
      lineHeight="18px"
      fontWeight={600}
    >
      <chakra.span role="columnheader" gridArea="rank" srOnly>
        Rank
      </chakra.span>
      <span role="columnheader" style={{ gridArea: 'place' }}>
        {subjectWords(tryOut).column}
      </span>
      <AxisHead axis={axis} ranking={ranking} />
      <span role="columnheader" style={{ gridArea: 'value' }}>
        {rankingWords(ranking).column}
      </span>
      <chakra.span role="columnheader" gridArea="words" display={onDesk}>
        Against the first
      </chakra.span>
      <chakra.span role="columnheader" gridArea="cymbals" display={onDesk}>
        Cymbals over drums <Lettered>b</Lettered>
      </chakra.span>
      <chakra.span role="columnheader" gridArea="winner" textAlign="center">
        Winner
      </chakra.span>
    </Box>
  );
}

function AxisHead({ axis, ranking }: { axis: ValueAxis; ranking: TryOutRankingResponse }) {
  return (
    <chakra.span
      role="columnheader"
      gridArea="picture"
      display={{ base: 'none', lg: 'flex' }}
      justifyContent="space-between"
      fontWeight={400}
      color="ink.muted"
    >
      <chakra.span srOnly>Picture, from</chakra.span>
      <span>{axis.min === 0 ? '0' : shortValue(axis.min, ranking)}</span>
      <span>{axis.max === 0 ? '0' : shortValue(axis.max, ranking)}</span>
    </chakra.span>
  );
}
