import { Box, chakra } from '@chakra-ui/react';
import type { TryOutRankingResponse, TryOutResponse } from '@thudline/contracts';
import { TextLink } from '../../../components/TextLink';
import { missing, signedDecibels } from '../../../lib/format';
import { cymbalsLoudFromDb } from '../../sheet/pictures/balanceLineLayout';
import { valueWords } from '../measureWords';
import type { LengthUnit } from '../positionWords';
import { placeName, reasonWords, type RankedPlace } from '../rows';
import type { ValueAxis } from '../valueAxis';
import { onDesk, rankedGrid } from './rankedGrid';
import { ValuePicture } from './ValuePicture';
import { WinnerCell } from './WinnerCell';

interface RankedRowProps {
  of: RankedPlace;
  axis: ValueAxis;
  tryOut: TryOutResponse;
  ranking: TryOutRankingResponse;
  lengthUnit: LengthUnit;
  wins: boolean;
  onChoose?: () => void;
}

/** One take of the ranking. */
export function RankedRow({ of, axis, tryOut, ranking, lengthUnit, wins, onChoose }: RankedRowProps) {
  const { place, row, isCurrent } = of;
  const name = placeName(place, tryOut, lengthUnit);
  const take = `take ${place.take.number}`;
  return (
    <Box
      role="row"
      {...rankedGrid}
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
