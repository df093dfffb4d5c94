import { chakra } from '@chakra-ui/react';
import { RowPicture } from '../../takes/components/LevelPicture';
import type { RankedPlace } from '../rows';
import type { ValueAxis } from '../valueAxis';

/** One take's figure on the axis all rows share: ring = now, disc = the best, bar = 95 % interval. */
export function ValuePicture({ of: { row, isCurrent }, axis }: { of: RankedPlace; axis: ValueAxis }) {
  const percent = (value: number) => `${(100 * (value - axis.min)) / (axis.max - axis.min)}%`;
  if (row.value === null) return null;
  const at = percent(row.value);
  const best = row.standing === 'best';
  return (
    <RowPicture aria-hidden>
      {axis.min <= 0 && axis.max >= 0 && (
        <chakra.line x1={percent(0)} x2={percent(0)} y1="0" y2="100%" stroke="edge" strokeWidth="1.75" />
      )}
      <chakra.line x1="0" x2="100%" y1="50%" y2="50%" stroke="rule" strokeWidth="1.5" />
      {row.interval95 && (
        <chakra.line
          x1={percent(row.interval95.low)}
          x2={percent(row.interval95.high)}
          y1="50%"
          y2="50%"
          stroke="together"
          strokeWidth="6"
        />
      )}
      {best && <chakra.circle cx={at} cy="50%" r="6.5" fill="ink" />}
      {!best && isCurrent && (
        <chakra.circle cx={at} cy="50%" r="5.5" fill="sheet" stroke="ink" strokeWidth="2.2" />
      )}
      {!best && !isCurrent && (
        <svg x={at} y="50%" overflow="visible">
          <chakra.line x1="0" x2="0" y1="-7.5" y2="7.5" stroke="ink" strokeWidth="3.2" />
        </svg>
      )}
    </RowPicture>
  );
}
