import { Box, chakra } from '@chakra-ui/react';
import type { TryOutRankingResponse, TryOutResponse } from '@thudline/contracts';
import { TextLink } from '../../../components/TextLink';
import { missing, signedDecibels } from '../../../lib/format';
import { cymbalsLoudFromDb } from '../../sheet/pictures/balanceLineLayout';
import { rankingWords, shortValue, valueWords } from '../measureWords';
import type { LengthUnit } from '../positionWords';
import { placeName, reasonWords, type RankedPlace } from '../rows';
import { subjectWords } from '../subjectWords';
import { valueAxis, type ValueAxis } from '../valueAxis';
import { Lettered } from './Lettered';
import { ValuePicture } from './ValuePicture';

const grid = {
  display: 'grid',
  columnGap: { base: '10px', lg: '12px' },
  gridTemplateColumns: {
    base: '24px minmax(0, 1fr) auto 48px',
    lg: '28px minmax(0, 138px) 126px 76px minmax(0, 1fr) 92px 56px',
  },
  gridTemplateAreas: {
    base: '"rank place value winner" "rank words words winner" "rank cymbals cymbals winner"',
    lg: '"rank place picture value words cymbals winner"',
  },
} as const;

const onDesk = { base: 'none', lg: 'block' } as const;

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
      <Box
        role="row"
        {...grid}
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
          {words.column}
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

function RankedRow({
  of,
  axis,
  tryOut,
  ranking,
  lengthUnit,
  wins,
  onChoose,
}: {
  of: RankedPlace;
  axis: ValueAxis;
  tryOut: TryOutResponse;
  ranking: TryOutRankingResponse;
  lengthUnit: LengthUnit;
  wins: boolean;
  onChoose?: () => void;
}) {
  const { place, row, isCurrent } = of;
  const name = placeName(place, tryOut, lengthUnit);
  const take = `take ${place.take.number}`;
  return (
    <Box
      role="row"
      {...grid}
      alignItems="center"
      minHeight="47px"
      paddingY={{ base: '8px', lg: '2px' }}
      borderBottom="1px solid"
      borderColor="rule"
      bg={wins ? 'target' : undefined}
      boxShadow={wins ? 'inset 4px 0 0 var(--chakra-colors-ink)' : undefined}
    >
      <chakra.span role="cell" gridArea="rank" fontWeight={600} textAlign="center">
        {row.rank ?? missing}
      </chakra.span>
      <Box role="cell" gridArea="place" lineHeight="21px" fontSize="16px">
        <b style={{ fontWeight: 600 }}>{name}</b>{' '}
        {name !== take && <TextLink to={`/takes/${place.take.id}`}>{take}</TextLink>}
        {isCurrent && (
          <Box fontSize="caption" lineHeight="18px" color="ink.muted">
            stands here now
          </Box>
        )}
      </Box>
      <Box role="cell" gridArea="picture" display={onDesk} position="relative" alignSelf="stretch">
        <ValuePicture of={of} axis={axis} />
      </Box>
      <chakra.span role="cell" gridArea="value" fontWeight={600} whiteSpace="nowrap" fontSize="16px">
        {row.value === null ? missing : valueWords(row.value, ranking)}
      </chakra.span>
      <chakra.span role="cell" gridArea="words" fontSize={{ base: 'small', lg: '16px' }} lineHeight="20px">
        {row.reason ? reasonWords[row.reason] : row.word}
      </chakra.span>
      <Cymbals differenceDb={row.cymbalsOverDrumsDb} />
      <WinnerCell label={`${name}, ${take}`} wins={wins} onChoose={onChoose} />
    </Box>
  );
}

function Cymbals({ differenceDb }: { differenceDb: number | null }) {
  const loud = differenceDb !== null && differenceDb > cymbalsLoudFromDb;
  return (
    <chakra.span
      role="cell"
      gridArea="cymbals"
      fontSize={{ base: 'caption', lg: '16px' }}
      color={loud ? 'watch' : 'ink.muted'}
      fontWeight={loud ? 600 : 400}
    >
      <chakra.span display={{ lg: 'none' }}>cymbals over drums </chakra.span>
      {differenceDb === null ? missing : signedDecibels(differenceDb)}
      {loud && <chakra.span srOnly> (watch)</chakra.span>}
    </chakra.span>
  );
}

function WinnerCell({ label, wins, onChoose }: { label: string; wins: boolean; onChoose?: () => void }) {
  if (!onChoose)
    return (
      <chakra.span role="cell" gridArea="winner" textAlign="center">
        {wins ? 'winner' : ''}
      </chakra.span>
    );
  return (
    <Box role="cell" gridArea="winner" display="grid" placeItems="center">
      <chakra.label display="grid" placeItems="center" width="44px" height="44px" cursor="pointer">
        <chakra.input
          type="radio"
          name="winner"
          aria-label={`${label} wins`}
          checked={wins}
          onChange={onChoose}
          appearance="none"
          width="22px"
          height="22px"
          border="2.4px solid"
          borderColor="ink"
          borderRadius="50%"
          cursor="pointer"
          _checked={{ background: 'radial-gradient(var(--chakra-colors-ink) 0 5px, transparent 5.6px)' }}
        />
      </chakra.label>
    </Box>
  );
}
