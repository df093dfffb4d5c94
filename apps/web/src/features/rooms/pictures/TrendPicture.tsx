import { Box } from '@chakra-ui/react';
import type { RoomChangeResponse, RoomTrendResponse } from '@thudline/contracts';
import { number, plural } from '../../../lib/format';
import { useWidth } from '../../../lib/useWidth';
import { ink } from '../../sheet/pictures/ink';
import { PictureText } from '../../sheet/pictures/PictureText';
import { dayWords, trendUnit, trendValue, trendWords } from '../roomWords';
import { NumberRing } from './NumberRing';
import { shortName } from './shortName';
import { trendLayout, type TimeView, type TrendLayout } from './trendLayout';

const topPx = 58;
const heightPx = 150;
const monthName = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'short', timeZone: 'UTC' });

/** A figure over time: a ring a take with its spread, the middle value between changes, changes as numbered verticals. */
export function TrendPicture({
  trend,
  changes,
  view = null,
}: {
  trend: RoomTrendResponse;
  changes: readonly RoomChangeResponse[];
  view?: TimeView | null;
}) {
  const { ref, widthPx } = useWidth<HTMLDivElement>();
  const size = { widthPx, topPx, heightPx, leftPx: 46, rightPx: 8 };
  const layout = trendLayout(trend.points, changes, size, view);
  return (
    <Box ref={ref} marginTop="10px">
      <svg
        width={widthPx}
        height={topPx + heightPx + 34}
        role="img"
        aria-label={describe(trend, changes)}
        style={{ display: 'block' }}
      >
        <Axis layout={layout} trend={trend} widthPx={widthPx} />
        {layout.spans.map((span, i) => (
          <g key={i}>
            <rect
              x={span.fromX}
              y={span.bandTopY}
              width={Math.max(2, span.toX - span.fromX)}
              height={Math.max(2, span.bandBottomY - span.bandTopY)}
              fill={ink.together}
              opacity={0.75}
            />
            <path d={`M${span.fromX} ${span.middleY}H${span.toX}`} stroke={ink.ink} strokeWidth="2.6" />
          </g>
        ))}
        {layout.verticals.map((vertical) => (
          <Vertical key={vertical.change.number} {...vertical} />
        ))}
        {layout.points.map(({ point, x, y, lowY, highY }) => (
          <g key={point.takeId}>
            <path d={`M${x} ${lowY}V${highY}`} stroke={ink.overhead} strokeWidth="1.6" />
            <circle cx={x} cy={y} r={4.6} fill={ink.sheet} stroke={ink.overhead} strokeWidth="2" />
          </g>
        ))}
      </svg>
    </Box>
  );
}

function Axis({
  layout,
  trend,
  widthPx,
}: {
  layout: TrendLayout;
  trend: RoomTrendResponse;
  widthPx: number;
}) {
  const unit = trendUnit(trend.figure);
  const digits = unit === 's' || unit === 'ms' ? 2 : 1;
  const whole = layout.ticks.every(({ value }) => Math.abs(value * 10 - Math.round(value * 10)) < 1e-6);
  return (
    <>
      {layout.ticks.map(({ value, y }, i) => (
        <g key={value}>
          <path d={`M40 ${y}H${widthPx}`} stroke={ink.rule} />
          <PictureText x={34} y={y + 4} textAnchor="end" fill={ink.muted}>
            {number(value, digits === 2 ? (whole ? 1 : 2) : Number.isInteger(value) ? 0 : 1)}
            {i === layout.ticks.length - 1 ? ` ${unit}` : ''}
          </PictureText>
        </g>
      ))}
      {layout.months.map(({ at, x }) => (
        <PictureText
          key={at.toISOString()}
          x={Math.min(x, widthPx - 20)}
          y={topPx + heightPx + 24}
          textAnchor="middle"
          fill={ink.muted}
        >
          {monthName.format(at)}
        </PictureText>
      ))}
    </>
  );
}

function Vertical({ change, x, labelX, roomPx, hasTakesAfter }: TrendLayout['verticals'][number]) {
  const name = shortName(change.what, roomPx);
  return (
    <g>
      {name && (
        <PictureText x={labelX + 15} y={18.5} fill={ink.muted}>
          {name}
        </PictureText>
      )}
      <path
        d={`M${labelX} 26L${x} 40V${topPx + heightPx}`}
        fill="none"
        stroke={ink.ink}
        strokeWidth="1.4"
        strokeDasharray={hasTakesAfter ? undefined : '2 4'}
      />
      <NumberRing number={change.number} x={labelX} y={14} />
    </g>
  );
}

function describe({ figure, points }: RoomTrendResponse, changes: readonly RoomChangeResponse[]): string {
  const told = (value: number) => trendValue(value, figure);
  const [first, last] = [points[0], points[points.length - 1]];
  const marks = [...changes]
    .reverse()
    .map((c) => `change ${c.number} on ${dayWords(c.happenedOn)}: ${c.what}`);
  return [
    `${trendWords[figure]} of ${plural(points.length, 'take')}, from ${told(first.value)} on ${dayWords(first.recordedAt)} to ${told(last.value)} on ${dayWords(last.recordedAt)}.`,
    ...(marks.length > 0 ? [`${marks.join('; ')}.`] : []),
  ].join(' ');
}
