import { Box } from '@chakra-ui/react';
import type { ReportResponse } from '@thudline/contracts';
import { useEffect, useRef } from 'react';
import { clock } from '../../../lib/format';
import { useWidth } from '../../../lib/useWidth';
import { ink } from '../../sheet/pictures/ink';
import { PictureText } from '../../sheet/pictures/PictureText';
import { ticksMs } from '../../sheet/pictures/traceView';
import type { TwoTakes } from '../hooks/useTwoTakes';
import { hitRowsScale, kickTimesS, nearestHit, rowTicks } from './hitRowsLayout';

const axisY = 32;
const heightPx = 80;

interface HitRowsProps {
  reports: readonly [ReportResponse, ReportResponse];
  /** Numbers of the takes, for the text alternative. */
  names: readonly [string, string];
  listening: TwoTakes;
  /** Which kick hit is chosen, from 0; null without any. */
  chosen: number | null;
  onChoose: (place: number) => void;
}

/** The kick hits of both takes, aligned on the first: the take before above the line, the take after below it. */
export function HitRows({ reports, names, listening, chosen, onChoose }: HitRowsProps) {
  const { ref, widthPx } = useWidth<HTMLDivElement>();
  const { time } = listening;
  const scale = hitRowsScale(time, widthPx);
  const rows = reports.map((report, i) => kickTimesS(report, time.zerosS[i]));
  const chosenX = chosen === null ? null : scale.x(rows[1][chosen] ?? 0);
  const chooseAt = (clientX: number) => {
    if (Math.min(...rows.map((row) => row.length)) === 0) return;
    const left = ref.current?.getBoundingClientRect().left ?? 0;
    onChoose(nearestHit(rows, scale.timeS(clientX - left)));
  };
  return (
    <Box ref={ref} marginTop="14px" cursor="pointer" onClick={(event) => chooseAt(event.clientX)}>
      <svg
        width={widthPx}
        height={heightPx}
        role="img"
        aria-label={describe(rows, names)}
        style={{ display: 'block' }}
      >
        <circle cx="7" cy={axisY - 12} r="5" fill={ink.sheet} stroke={ink.ink} strokeWidth="2" />
        <circle cx="7" cy={axisY + 12} r="6" fill={ink.ink} />
        <path d={`M${scale.leftPx} ${axisY}H${widthPx}`} stroke={ink.ink} strokeWidth="1.6" />
        {reports.map((report, row) =>
          rowTicks(report, { zeroS: time.zerosS[row], endS: time.endS, x: scale.x }).map(
            ({ x, heightPx: px }, i) => (
              <path
                key={`${row}-${i}`}
                d={`M${x} ${axisY}v${row === 0 ? -px : px}`}
                stroke={ink.kick}
                strokeWidth="2"
              />
            ),
          ),
        )}
        {chosenX !== null && <path d={`M${chosenX - 5} 0h10l-5 8z`} fill={ink.ink} />}
        <Playhead listening={listening} x={scale.x} />
        {[0, ...ticksMs({ fromMs: 0, toMs: time.endS }, widthPx < 480 ? 3 : 6)].map((timeS) => (
          <PictureText key={timeS} x={scale.x(timeS)} y={heightPx - 4} textAnchor="middle" fill={ink.muted}>
            {clock(timeS)}
          </PictureText>
        ))}
      </svg>
    </Box>
  );
}

/** One line over both rows; moved beside React, many times a second. */
function Playhead({ listening, x }: { listening: TwoTakes; x: (timeS: number) => number }) {
  const line = useRef<SVGPathElement>(null);
  const { state, positionS } = listening;
  useEffect(() => {
    if (state !== 'playing') return;
    let frame = 0;
    const draw = () => {
      const at = positionS();
      if (at !== null) line.current?.setAttribute('d', `M${x(at).toFixed(1)} 2V${2 * axisY - 2}`);
      frame = requestAnimationFrame(draw);
    };
    draw();
    return () => cancelAnimationFrame(frame);
  });
  return state === 'playing' ? <path ref={line} stroke={ink.ink} strokeWidth="2.4" /> : null;
}

function describe(rows: readonly (readonly number[])[], [before, after]: readonly [string, string]): string {
  return `Kick hits of both takes on one time: ${rows[0].length} in ${before}, ${rows[1].length} in ${after}, aligned on the first.`;
}
