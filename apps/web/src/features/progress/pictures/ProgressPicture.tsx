import { Box } from '@chakra-ui/react';
import type { ProgressFigure, TakeProgress } from '@thudline/contracts';
import { number } from '../../../lib/format';
import { useWidth } from '../../../lib/useWidth';
import { ink } from '../../sheet/pictures/ink';
import { PictureText } from '../../sheet/pictures/PictureText';
import type { ProgressPoint } from '../progressFigures';
import { progressInWords } from '../progressHead';
import { progressLayout } from './progressLayout';

const size = { topPx: 14, heightPx: 170, leftPx: 52, rightPx: 8 };
const month = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'short', timeZone: 'UTC' });

/** A figure over weeks: a ring a take, the thick line the middle of a week. */
export function ProgressPicture({
  figure,
  points,
  clipped,
}: {
  figure: ProgressFigure;
  points: readonly ProgressPoint[];
  clipped: readonly TakeProgress[];
}) {
  const { ref, widthPx } = useWidth<HTMLDivElement>();
  const crosses = clipped.map((take) => ({ number: take.number, timeMs: Date.parse(take.recordedAt) }));
  const layout = progressLayout(points, crosses, { widthPx, ...size });
  const bottomY = size.topPx + size.heightPx;
  return (
    <Box ref={ref} marginTop="14px">
      <svg
        width={widthPx}
        height={bottomY + 30}
        role="img"
        aria-label={progressInWords(points, figure)}
        style={{ display: 'block' }}
      >
        {layout.ticks.map(({ value, y }, i) => (
          <g key={value}>
            <path d={`M46 ${y}H${widthPx}`} stroke={ink.rule} />
            <PictureText x={40} y={y + 4} textAnchor="end" fill={ink.muted}>
              {number(value, Number.isInteger(value) ? 0 : 1)}
              {i === layout.ticks.length - 1 ? ' dB' : ''}
            </PictureText>
          </g>
        ))}
        {layout.months.map(({ at, x }) => (
          <PictureText
            key={at.toISOString()}
            x={Math.max(46, Math.min(x, widthPx - 20))}
            y={bottomY + 24}
            textAnchor="middle"
            fill={ink.muted}
          >
            {month.format(at)}
          </PictureText>
        ))}
        {layout.weeks.map(({ fromX, toX, y }) => (
          <path key={fromX} d={`M${fromX} ${y}H${toX}`} stroke={ink.ink} strokeWidth="2.6" />
        ))}
        {layout.points.map(({ point, x, y }) => (
          <circle
            key={point.take.takeId}
            cx={x}
            cy={y}
            r={4.6}
            fill={ink.sheet}
            stroke={ink.overhead}
            strokeWidth="2"
          />
        ))}
        {layout.crosses.map(({ number: take, x, y }) => (
          <path key={take} d={`M${x - 5} ${y - 5}l10 10m0 -10l-10 10`} stroke={ink.fix} strokeWidth="2" />
        ))}
      </svg>
    </Box>
  );
}
