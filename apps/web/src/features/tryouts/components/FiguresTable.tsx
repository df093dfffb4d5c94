import { Box, chakra } from '@chakra-ui/react';
import type { TryOutRankingResponse, TryOutResponse } from '@thudline/contracts';
import { missing } from '../../../lib/format';
import { rankingWords, shortValue, valueWords } from '../measureWords';
import type { LengthUnit } from '../positionWords';
import { placeName, type RankedPlace } from '../rows';

/** The plot's figures as a table. */
export function FiguresTable({
  tryOut,
  ranking,
  ranked,
  lengthUnit,
}: {
  tryOut: TryOutResponse;
  ranking: TryOutRankingResponse;
  ranked: readonly RankedPlace[];
  lengthUnit: LengthUnit;
}) {
  const words = rankingWords(ranking);
  return (
    <Box overflowX="auto" marginTop="10px" tabIndex={0} role="group" aria-label="The plot as a table">
      <chakra.table
        fontSize="small"
        width="100%"
        css={{ '& th, & td': { textAlign: 'left', padding: '3px 12px 3px 0', fontWeight: 400 } }}
      >
        <chakra.caption textAlign="left" color="ink.muted" fontSize="caption" captionSide="top">
          {words.axis}
        </chakra.caption>
        <chakra.thead borderBottom="1px solid" borderColor="rule">
          <tr>
            <th scope="col">Position</th>
            <th scope="col">Take</th>
            <th scope="col">{words.column}</th>
            <th scope="col">95 % interval</th>
            <th scope="col">Hits</th>
          </tr>
        </chakra.thead>
        <tbody>
          {ranked.map(({ place, row }) => (
            <tr key={place.id}>
              <th scope="row">{placeName(place, tryOut, lengthUnit)}</th>
              <td>{place.take.number}</td>
              <td>{row.value === null ? missing : valueWords(row.value, ranking)}</td>
              <td>
                {row.interval95
                  ? `${shortValue(row.interval95.low, ranking)} to ${shortValue(row.interval95.high, ranking)}`
                  : missing}
              </td>
              <td>{row.hits}</td>
            </tr>
          ))}
        </tbody>
      </chakra.table>
    </Box>
  );
}
