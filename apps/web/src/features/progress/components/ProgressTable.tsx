import { chakra } from '@chakra-ui/react';
import { TextLink } from '../../../components/TextLink';
import { date, number } from '../../../lib/format';
import { weeksOf, type ProgressPoint } from '../progressFigures';

const cell = { textAlign: 'left', paddingY: '7px', paddingRight: '16px', verticalAlign: 'baseline' } as const;

/** Week by week, newest first: the middle value, and the takes behind it. */
export function ProgressTable({
  points,
  openTakes,
}: {
  points: readonly ProgressPoint[];
  /** Somebody else's takes are told, not opened. */
  openTakes: boolean;
}) {
  return (
    <chakra.table width="100%" marginTop="18px" fontSize="small" lineHeight="22px">
      <thead>
        <chakra.tr borderBottom="2px solid" borderColor="ink" fontSize="caption" color="ink.muted">
          {['Week of', 'Middle, dB', 'Takes, dB'].map((head) => (
            <chakra.th key={head} scope="col" fontWeight={400} {...cell}>
              {head}
            </chakra.th>
          ))}
        </chakra.tr>
      </thead>
      <tbody>
        {[...weeksOf(points)].reverse().map(({ startMs, middle, points: inside }) => (
          <chakra.tr key={startMs} borderBottom="1px solid" borderColor="rule">
            <chakra.th scope="row" fontWeight={400} whiteSpace="nowrap" {...cell}>
              {date(new Date(startMs + 12 * 3_600_000).toISOString())}
            </chakra.th>
            <chakra.td fontWeight={600} {...cell}>
              {number(middle, 1)}
            </chakra.td>
            <chakra.td {...cell}>
              {inside.map(({ take, value }, i) => (
                <span key={take.takeId}>
                  {i > 0 && ', '}
                  {openTakes ? (
                    <TextLink to={`/takes/${take.takeId}`}>take {take.number}</TextLink>
                  ) : (
                    `take ${take.number}`
                  )}{' '}
                  {number(value, 1)}
                </span>
              ))}
            </chakra.td>
          </chakra.tr>
        ))}
      </tbody>
    </chakra.table>
  );
}
