import { chakra } from '@chakra-ui/react';
import type { RoomTrendResponse } from '@thudline/contracts';
import { TextLink } from '../../../components/TextLink';
import { missing } from '../../../lib/format';
import { dayWords, trendValue } from '../roomWords';

const cell = { textAlign: 'left', paddingY: '4px', paddingRight: '16px', fontWeight: 400 } as const;

/** The takes of the picture as numbers. */
export function TrendTable({ trend: { figure, points } }: { trend: RoomTrendResponse }) {
  return (
    <chakra.details css={{ '&[open]': { flexBasis: '100%', minWidth: 0 } }}>
      <chakra.summary cursor="pointer" color="ink.muted" width="fit-content" paddingY="6px">
        as a table
      </chakra.summary>
      <chakra.div
        overflow="auto"
        maxHeight="420px"
        tabIndex={0}
        role="group"
        aria-label="Figures of every take"
      >
        <chakra.table minWidth="320px">
          <thead>
            <chakra.tr borderBottom="1px solid" borderColor="rule" color="ink.muted" fontSize="caption">
              {['Day', 'Take', 'Value', 'Between the quartiles', 'Setup'].map((head) => (
                <chakra.th key={head} scope="col" {...cell}>
                  {head}
                </chakra.th>
              ))}
            </chakra.tr>
          </thead>
          <tbody>
            {points.map(({ takeId, number, recordedAt, value, iqr, setup }) => (
              <chakra.tr key={takeId} borderBottom="1px solid" borderColor="rule">
                <chakra.td {...cell}>{dayWords(recordedAt)}</chakra.td>
                <chakra.td {...cell}>
                  <TextLink to={`/takes/${takeId}`}>take {number}</TextLink>
                </chakra.td>
                <chakra.td {...cell} fontWeight={600} whiteSpace="nowrap">
                  {trendValue(value, figure)}
                </chakra.td>
                <chakra.td {...cell} whiteSpace="nowrap">
                  {iqr === null ? missing : trendValue(iqr, figure).replace('dBFS', 'dB')}
                </chakra.td>
                <chakra.td {...cell}>{setup?.name ?? missing}</chakra.td>
              </chakra.tr>
            ))}
          </tbody>
        </chakra.table>
      </chakra.div>
    </chakra.details>
  );
}
