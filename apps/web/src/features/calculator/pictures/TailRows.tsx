import { Box, chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';
import { useWidth } from '../../../lib/useWidth';
import { ink } from '../../sheet/pictures/ink';
import { PictureText } from '../../sheet/pictures/PictureText';
import { bandName, tailText } from '../calculatorWords';
import type { BandEstimate } from '../tailEstimate';
import { tailRowsLayout, type TailRow, type TailRowsLayout } from './tailRowsLayout';

const rowPx = 30;

const namePx = { base: '62px', md: '84px' };
const figuresPx = { base: '108px', md: '130px' };

/** An octave a row: ring now, disc with what is planned; the figures beside. */
export function TailRows({ bands }: { bands: readonly BandEstimate[] }) {
  const { ref, widthPx } = useWidth<HTMLDivElement>(340);
  const layout = tailRowsLayout(bands, widthPx);
  return (
    <Box
      display="grid"
      gridTemplateColumns={{
        base: `${namePx.base} minmax(0, 1fr) ${figuresPx.base}`,
        md: `${namePx.md} minmax(0, 1fr) ${figuresPx.md} 124px`,
      }}
      columnGap={{ base: '8px', md: '16px' }}
      marginTop="14px"
      fontSize="small"
      lineHeight={`${rowPx}px`}
    >
      <Column>
        {bands.map(({ centreHz }) => (
          <div key={centreHz}>{bandName(centreHz)}</div>
        ))}
      </Column>
      <Box ref={ref} minWidth={0}>
        <svg
          width={widthPx}
          height={bands.length * rowPx + 26}
          role="img"
          aria-label={bands.map(inWords).join(' ')}
          style={{ display: 'block' }}
        >
          <Axis layout={layout} heightPx={bands.length * rowPx} widthPx={widthPx} />
          {layout.rows.map((row, i) => (
            <Row key={row.band.centreHz} row={row} y={i * rowPx + rowPx / 2} widthPx={widthPx} />
          ))}
        </svg>
      </Box>
      <Column>
        {bands.map(({ centreHz, before, after }) => (
          <chakra.div key={centreHz} fontWeight={600} whiteSpace="nowrap">
            {tailText(before.eyringS)} → {tailText(after.eyringS)} s
          </chakra.div>
        ))}
      </Column>
      <Column onlyWide>
        {bands.map(({ centreHz, before, after }) => (
          <chakra.div key={centreHz} color="ink.muted" whiteSpace="nowrap" textAlign="right">
            Sabine {tailText(before.sabineS)} → {tailText(after.sabineS)}
          </chakra.div>
        ))}
      </Column>
    </Box>
  );
}

/** What the picture's words say already. */
function Column({ onlyWide = false, children }: { onlyWide?: boolean; children: ReactNode }) {
  return (
    <Box aria-hidden display={onlyWide ? { base: 'none', md: 'block' } : undefined}>
      {children}
    </Box>
  );
}

function Axis({ layout, heightPx, widthPx }: { layout: TailRowsLayout; heightPx: number; widthPx: number }) {
  return (
    <>
      {layout.ticks.map(({ seconds, x, text }, i) => (
        <g key={seconds}>
          <path
            d={`M${x} 0V${heightPx}`}
            stroke={i === 0 ? ink.ink : ink.rule}
            strokeWidth={i === 0 ? 1.6 : 1}
          />
          <PictureText
            x={Math.min(x, widthPx - text.length * 3.5)}
            y={heightPx + 18}
            textAnchor="middle"
            fill={ink.muted}
          >
            {text}
          </PictureText>
        </g>
      ))}
    </>
  );
}

function Row({ row: { beforeX, afterX, arrow }, y, widthPx }: { row: TailRow; y: number; widthPx: number }) {
  return (
    <>
      <path d={`M8 ${y}H${widthPx}`} stroke={ink.rule} />
      {arrow && (
        <path
          d={`M${arrow.fromX} ${y}H${arrow.toX}M${arrow.headX} ${y - 5}L${arrow.toX} ${y}L${arrow.headX} ${y + 5}`}
          fill="none"
          stroke={ink.ink}
          strokeWidth="2"
        />
      )}
      {beforeX !== null && (
        <circle cx={beforeX} cy={y} r={6} fill={ink.sheet} stroke={ink.ink} strokeWidth="2" />
      )}
      {afterX !== null && <circle cx={afterX} cy={y} r={6.2} fill={ink.ink} />}
    </>
  );
}

const inWords = ({ centreHz, before, after }: BandEstimate) =>
  `${bandName(centreHz)}: ${tailText(before.eyringS)} s now, ${tailText(after.eyringS)} s with it.`;
