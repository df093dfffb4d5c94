import { Box, Flex, chakra } from '@chakra-ui/react';
import type { ReportResponse } from '@thudline/contracts';
import { useId, useMemo } from 'react';
import { TextButton } from '../../../components/Button';
import { number } from '../../../lib/format';
import { useWidth } from '../../../lib/useWidth';
import type { Excerpt } from '../../sheet/hooks/useExcerpt';
import { Hatch } from '../../sheet/pictures/Hatch';
import { ink, lineOnPaper } from '../../sheet/pictures/ink';
import {
  apartPath,
  filtered,
  largest,
  linePath,
  sampleTrace,
  togetherPath,
  togetherShare,
  type TraceBand,
  type TracePoints,
  type TraceScale,
} from '../../sheet/pictures/pairTraceLayout';
import { PictureText } from '../../sheet/pictures/PictureText';
import { ticksMs, type TraceView } from '../../sheet/pictures/traceView';
import { useTraceView } from '../../sheet/pictures/useTraceView';

const rowPx = 124;
const halfPx = 46;
const axisPx = 22;

export interface TraceTake {
  report: ReportResponse;
  excerpt: Excerpt;
  /** Of the hit, in seconds of its take. */
  hitS: number;
  label: string;
}

/** The same hit of both takes, each to its own size, on one time base. */
export function TwoTraces({ takes, band }: { takes: readonly [TraceTake, TraceTake]; band: TraceBand }) {
  const { ref, widthPx } = useWidth<HTMLDivElement>();
  const { view, moved, reset, zoomBy, surface } = useTraceView(band, widthPx);
  const heightPx = 2 * rowPx + axisPx;
  return (
    <Box ref={ref} marginTop="8px">
      <Box
        {...surface}
        tabIndex={0}
        role="group"
        aria-label="The same hit in both. Plus and minus zoom, Shift with the arrows moves, 0 shows it as it was."
        cursor="grab"
        touchAction="pan-y"
        _active={{ cursor: 'grabbing' }}
      >
        <chakra.svg width={`${widthPx}px`} height={`${heightPx}px`} display="block" role="presentation">
          <TimeGrid {...{ view, widthPx }} />
          {takes.map((take, i) => (
            <TraceRow key={i} {...{ take, band, view, widthPx }} topPx={i * rowPx} isAfter={i === 1} />
          ))}
        </chakra.svg>
      </Box>
      <Flex gap="14px" justifyContent="flex-end" fontSize="caption" color="ink.muted">
        <TextButton onClick={() => zoomBy(0.6)}>closer</TextButton>
        <TextButton onClick={() => zoomBy(1 / 0.6)}>wider</TextButton>
        {moved && <TextButton onClick={reset}>as it was</TextButton>}
      </Flex>
    </Box>
  );
}

interface TraceRowProps {
  take: TraceTake;
  band: TraceBand;
  view: TraceView;
  widthPx: number;
  topPx: number;
  isAfter: boolean;
}

function TraceRow({ take, band, view, widthPx, topPx, isAfter }: TraceRowProps) {
  const hatchId = useId();
  const { excerpt, hitS, report, label } = take;
  const signals = useMemo(() => filtered(excerpt, band), [excerpt, band]);
  const count = Math.max(120, Math.round(band === 'every' ? widthPx : widthPx / 2));
  const gain = 10 ** ((report.agreement.matchGainDb ?? 0) / 20);
  const recorded = sampleTrace({ signals, excerpt, hitS, view, shiftMs: 0, count });
  const points: TracePoints = { kick: recorded.kick, overhead: recorded.overhead.map((v) => v * gain) };
  const middle = topPx + 22 + halfPx;
  const half = largest(points.kick, points.overhead);
  const scale: TraceScale = {
    x: (i) => (i / (count - 1)) * widthPx,
    y: (v) => middle - (v / half) * halfPx,
  };
  return (
    <g role="img" aria-label={describe(points, label)}>
      <defs>
        <Hatch id={hatchId} color={ink.hatch} gapPx={7} />
      </defs>
      <path d={togetherPath(points, scale)} fill={ink.together} />
      <path d={apartPath(points, scale)} fill={`url(#${hatchId})`} />
      <path d={`M0 ${middle}H${widthPx}`} stroke={ink.edge} strokeWidth="1.2" />
      <chakra.path
        d={linePath(points.kick, scale)}
        fill="none"
        stroke={ink.kick}
        strokeWidth={{ base: '2.6px', _print: lineOnPaper.kick }}
        strokeLinejoin="round"
      />
      <chakra.path
        d={linePath(points.overhead, scale)}
        fill="none"
        stroke={ink.overhead}
        strokeWidth={{ base: '1.9px', _print: lineOnPaper.overhead }}
        strokeLinejoin="round"
      />
      <circle
        cx="7"
        cy={topPx + 12}
        r={isAfter ? 6 : 5}
        fill={isAfter ? ink.ink : ink.sheet}
        stroke={ink.ink}
        strokeWidth={isAfter ? 0 : 2}
      />
      <PictureText x={20} y={topPx + 17} bold fill={ink.ink}>
        {label}
      </PictureText>
    </g>
  );
}

/** Lines at the same times through both rows. */
function TimeGrid({ view, widthPx }: { view: TraceView; widthPx: number }) {
  const x = (ms: number) => ((ms - view.fromMs) / (view.toMs - view.fromMs)) * widthPx;
  const ticks = ticksMs(view, 5);
  return (
    <g aria-hidden>
      {ticks.map((ms) => (
        <g key={ms}>
          <path d={`M${x(ms)} 0V${2 * rowPx}`} stroke={ink.rule} strokeWidth="1.2" strokeDasharray="2 4" />
          <PictureText x={x(ms)} y={2 * rowPx + 15} textAnchor="middle" fill={ink.muted}>
            {number(ms, Number.isInteger(ms) ? 0 : 1)}
            {ms === ticks.at(-1) ? ' ms' : ''}
          </PictureText>
        </g>
      ))}
    </g>
  );
}

function describe(points: TracePoints, label: string): string {
  const share = Math.round(togetherShare(points) * 100);
  return `Kick and overhead, ${label}: they push the same way for ${share} % of what they share, and pull apart for the rest.`;
}
