import { Box } from '@chakra-ui/react';
import { signed } from '../../../lib/format';
import { useWidth } from '../../../lib/useWidth';
import { ink } from '../../sheet/pictures/ink';
import { halo, PictureText } from '../../sheet/pictures/PictureText';
import {
  belowRowPx,
  tryOutPlotLayout,
  type PlotLayout,
  type PlotMark,
  type PlotPoint,
} from './tryOutPlotLayout';

export interface PlotWords {
  /** "take 18" */
  take: string;
  /** "+1.9" */
  value: string;
  /** Under the axis: "100"; the unit stands once. */
  position: string;
  /** "stands here now", "fullest" */
  below: string;
}

interface TryOutPlotProps {
  points: readonly PlotPoint[];
  words: Readonly<Record<string, PlotWords>>;
  axisTitle: string;
  /** "0 = the kick alone"; null where zero says nothing. */
  zero: string | null;
  /** "above the snare" */
  from: string;
  unit: string;
  /** The finding, in words. */
  description: string;
}

/** Measure against position: ring = now, disc = the best, bars = 95 % interval. */
export function TryOutPlot({ points, words, axisTitle, zero, from, unit, description }: TryOutPlotProps) {
  const { ref, widthPx } = useWidth<HTMLDivElement>();
  const layout = tryOutPlotLayout({ points, widthPx, showsZero: zero !== null });
  const { left, right, bottom, heightPx, band, arrow, zeroY } = layout;
  const lastX = Math.max(...layout.marks.map(({ x }) => x));
  return (
    <Box ref={ref}>
      <svg width={widthPx} height={heightPx} role="img" aria-label={description} style={{ display: 'block' }}>
        <PictureText x={0} y={12} bold fill={ink.ink}>
          {axisTitle}
        </PictureText>
        {band && <Band band={band} {...{ left, right }} />}
        <ValueAxis layout={layout} />
        {zeroY !== null && zero !== null && (
          <PictureText x={right} y={zeroY - 9} textAnchor="end" fill={ink.muted} {...halo}>
            {zero}
          </PictureText>
        )}
        {band && (
          <PictureText
            x={right - 2}
            y={Math.max(layout.top + 14, band.top - 8)}
            textAnchor="end"
            fill={ink.muted}
            {...halo}
          >
            as good as the best, as far as we can tell
          </PictureText>
        )}
        {arrow && <path d={arrow.path} fill="none" stroke={ink.ink} strokeWidth="2.2" />}
        {arrow && (
          <path d={arrow.head} fill="none" stroke={ink.ink} strokeWidth="2.2" strokeLinecap="round" />
        )}
        {layout.marks.map((mark) => (
          <Mark key={mark.id} mark={mark} words={words[mark.id]} />
        ))}
        {layout.marks.map((mark) => (
          <PositionTick
            key={mark.id}
            {...{ mark, bottom }}
            words={words[mark.id]}
            unit={mark.x === lastX ? unit : ''}
          />
        ))}
        {from && widthPx >= 480 && (
          <PictureText x={0} y={bottom + 36} fill={ink.muted}>
            {from}
          </PictureText>
        )}
      </svg>
    </Box>
  );
}

function Band({ band, left, right }: { band: { top: number; bottom: number }; left: number; right: number }) {
  return (
    <rect
      x={left}
      y={band.top}
      width={right - left}
      height={Math.max(3, band.bottom - band.top)}
      fill={ink.target}
    />
  );
}

function ValueAxis({ layout: { ticks, left, right, bottom } }: { layout: PlotLayout }) {
  return (
    <>
      {ticks.map(({ value, y, digits }) => (
        <g key={value}>
          <path
            d={`M${left} ${y}H${right}`}
            stroke={y === bottom ? ink.ink : ink.rule}
            strokeWidth={y === bottom ? 1.5 : 1}
          />
          <PictureText x={left - 10} y={y + 4.5} textAnchor="end" fill={ink.muted}>
            {value === 0 ? '0' : signed(value, digits)}
          </PictureText>
        </g>
      ))}
    </>
  );
}

const barPx = 5;

function Mark({ mark, words }: { mark: PlotMark; words: PlotWords }) {
  const { x, y, lowY, highY, interval } = mark;
  const clear = mark.mark === 'plain' ? 0 : 8;
  return (
    <>
      {interval && (
        <path
          d={`M${x} ${highY}V${Math.max(highY, y - clear)}M${x} ${Math.min(lowY, y + clear)}V${lowY}M${x - barPx} ${highY}h${2 * barPx}M${x - barPx} ${lowY}h${2 * barPx}`}
          stroke={ink.ink}
          strokeWidth="1.8"
          fill="none"
        />
      )}
      {mark.mark === 'best' && <circle cx={x} cy={y} r={8} fill={ink.ink} />}
      {mark.mark === 'now' && (
        <circle cx={x} cy={y} r={7} fill={ink.sheet} stroke={ink.ink} strokeWidth="2.4" />
      )}
      {mark.mark === 'plain' && <path d={`M${x - 9} ${y}h18`} stroke={ink.ink} strokeWidth="3.4" />}
      {mark.words !== 'none' && (
        <text {...wordsPlace(mark)} fill={ink.muted} style={{ fontSize: '13px' }} {...halo}>
          {mark.words === 'beside' && (
            <tspan fill={ink.ink} style={{ fontWeight: 600 }}>
              {words.take}{' '}
            </tspan>
          )}
          {words.value}
        </text>
      )}
    </>
  );
}

/** Beside the mark, clear of ring and disc, or over the upper end of its bar. */
function wordsPlace({ words, wordsLeft, mark, x, y, highY }: PlotMark) {
  if (words === 'over')
    return { x, y: Math.min(highY, y - (mark === 'plain' ? 2 : 8)) - 7, textAnchor: 'middle' } as const;
  const beside = { y: mark === 'plain' ? y + 5 : y + 33 };
  return wordsLeft
    ? ({ ...beside, x: x - 14, textAnchor: 'end' } as const)
    : ({ ...beside, x: x + 14, textAnchor: 'start' } as const);
}

function PositionTick({
  mark: { x, mark, isNamed, belowRow },
  bottom,
  words,
  unit,
}: {
  mark: PlotMark;
  bottom: number;
  words: PlotWords;
  unit: string;
}) {
  return (
    <g>
      <path d={`M${x} ${bottom}v5`} stroke={ink.edge} strokeWidth="1.2" />
      {isNamed && (
        <PictureText
          x={x}
          y={bottom + 19}
          textAnchor="middle"
          bold={mark !== 'plain'}
          fill={mark === 'plain' ? ink.muted : ink.ink}
        >
          {words.position}
          {unit && (unit === '°' ? unit : ` ${unit}`)}
        </PictureText>
      )}
      {words.below && (
        <PictureText
          x={x}
          y={bottom + 36 + belowRow * belowRowPx}
          textAnchor="middle"
          bold={mark === 'best'}
          fill={mark === 'best' ? ink.ink : ink.muted}
          {...halo}
        >
          {words.below}
        </PictureText>
      )}
    </g>
  );
}
