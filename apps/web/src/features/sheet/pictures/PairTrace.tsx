import { Box, Flex, chakra } from '@chakra-ui/react';
import type { Choice } from '@thudline/dsp';
import { useId, useMemo } from 'react';
import { TextButton } from '../../../components/Button';
import { milliseconds, number } from '../../../lib/format';
import { useWidth } from '../../../lib/useWidth';
import type { Excerpt } from '../hooks/useExcerpt';
import { Hatch } from './Hatch';
import { ink, lineOnPaper } from './ink';
import { PictureText } from './PictureText';
import {
  apartPath,
  areaPath,
  filtered,
  largest,
  linePath,
  sampleTrace,
  togetherPath,
  togetherShare,
  type TraceBand,
  type TracePoints,
  type TraceScale,
} from './pairTraceLayout';
import { ticksMs, type TraceView } from './traceView';
import { useTraceView } from './useTraceView';
import { useTurn } from './useTurn';

const sizes = {
  pairMiddle: 66,
  pairHalf: 58,
  captionY: 160,
  addedMiddle: 212,
  addedScale: 0.54,
  axisY: 254,
  height: 272,
};

interface PairTraceProps {
  excerpt: Excerpt;
  hitS: number;
  band: TraceBand;
  choice: Choice & { label: string };
  arrivalMs: number | null;
}

/** Both microphones around one kick hit, and the two added below; flipping turns the overhead over. */
export function PairTrace({ excerpt, hitS, band, choice, arrivalMs }: PairTraceProps) {
  const { ref, widthPx } = useWidth<HTMLDivElement>();
  const hatchId = useId();
  const polarity = useTurn(choice.flipped ? -1 : 1);
  const shiftMs = useTurn(choice.shiftMs);
  const gain = 10 ** (choice.gainDb / 20);
  // Every frequency needs a point a pixel; the widest view of it is narrow enough for that.
  const count = Math.max(120, Math.round(band === 'every' ? widthPx : widthPx / 2));
  const signals = useMemo(() => filtered(excerpt, band), [excerpt, band]);
  const { view, moved, reset, zoomBy, surface } = useTraceView(band, widthPx);
  const at = (shift: number) => sampleTrace({ signals, excerpt, hitS, view, shiftMs: shift, count });

  const recorded = withGain(at(0), gain);
  const shown = withGain(at(shiftMs), gain * polarity);
  const half = largest(recorded.kick, recorded.overhead);
  const x = (i: number) => (i / (count - 1)) * widthPx;
  const pair: TraceScale = { x, y: (v) => sizes.pairMiddle - (v / half) * sizes.pairHalf };
  const addedScale: TraceScale = {
    x,
    y: (v) => sizes.addedMiddle - (v / half) * sizes.pairHalf * sizes.addedScale,
  };
  return (
    <Box ref={ref} marginTop="10px" position="relative">
      <Box
        {...surface}
        tabIndex={0}
        role="group"
        aria-label="Pair trace. Plus and minus zoom, Shift with the arrows moves, 0 shows it as it was."
        cursor="grab"
        touchAction="pan-y"
        _active={{ cursor: 'grabbing' }}
      >
        <svg
          width={widthPx}
          height={sizes.height}
          role="img"
          aria-label={describe(shown, choice.label)}
          style={{ display: 'block' }}
        >
          <defs>
            <Hatch id={hatchId} color={ink.hatch} gapPx={7} />
          </defs>
          <path d={togetherPath(shown, pair)} fill={ink.together} />
          <path d={apartPath(shown, pair)} fill={`url(#${hatchId})`} />
          <path d={`M0 ${sizes.pairMiddle}H${widthPx}`} stroke={ink.edge} strokeWidth="1.2" />
          <chakra.path
            d={linePath(shown.kick, pair)}
            fill="none"
            stroke={ink.kick}
            strokeWidth={{ base: '2.6px', _print: lineOnPaper.kick }}
            strokeLinejoin="round"
          />
          <chakra.path
            d={linePath(shown.overhead, pair)}
            fill="none"
            stroke={ink.overhead}
            strokeWidth={{ base: '1.9px', _print: lineOnPaper.overhead }}
            strokeLinejoin="round"
            strokeDasharray={choice.flipped ? '7 4' : undefined}
          />
          {band === 'every' && <ArrivalBracket {...{ arrivalMs, shiftMs: choice.shiftMs, view, widthPx }} />}
          <AddedWave {...{ shown, recorded, scale: addedScale, widthPx, choice }} />
          <TimeAxis view={view} widthPx={widthPx} />
        </svg>
      </Box>
      <ZoomButtons {...{ moved, reset, zoomBy }} />
    </Box>
  );
}

const withGain = ({ kick, overhead }: TracePoints, gain: number): TracePoints => ({
  kick,
  overhead: overhead.map((v) => v * gain),
});
const added = ({ kick, overhead }: TracePoints) => kick.map((k, i) => k + overhead[i]);

function AddedWave({
  shown,
  recorded,
  scale,
  widthPx,
  choice,
}: {
  shown: TracePoints;
  recorded: TracePoints;
  scale: TraceScale;
  widthPx: number;
  choice: PairTraceProps['choice'];
}) {
  const now = added(shown);
  const changed = choice.flipped || choice.shiftMs !== 0;
  return (
    <>
      <PictureText x={0} y={sizes.captionY} fill={ink.muted}>
        <tspan style={{ fontWeight: 600 }} fill={ink.ink}>
          the two added
        </tspan>
        {changed ? ` solid: ${choice.label} · dotted: as recorded` : ' as recorded'}
      </PictureText>
      <path d={areaPath(now, scale)} fill={ink.together} />
      <path d={`M0 ${sizes.addedMiddle}H${widthPx}`} stroke={ink.edge} strokeWidth="1" />
      {changed && (
        <path
          d={linePath(added(recorded), scale)}
          fill="none"
          stroke={ink.ink}
          strokeWidth="1.5"
          strokeDasharray="1.5 4"
          strokeLinecap="round"
        />
      )}
      <path d={linePath(now, scale)} fill="none" stroke={ink.ink} strokeWidth="2.4" strokeLinejoin="round" />
    </>
  );
}

const xOfMs =
  ({ fromMs, toMs }: TraceView, widthPx: number) =>
  (ms: number) =>
    ((ms - fromMs) / (toMs - fromMs)) * widthPx;

function TimeAxis({ view, widthPx }: { view: TraceView; widthPx: number }) {
  const x = xOfMs(view, widthPx);
  const ticks = ticksMs(view, 5);
  return (
    <>
      {ticks.map((ms) => (
        <g key={ms}>
          <path d={`M${x(ms)} ${sizes.axisY - 8}v5`} stroke={ink.edge} strokeWidth="1.4" />
          <PictureText x={x(ms)} y={sizes.axisY + 11} textAnchor="middle" fill={ink.muted}>
            {number(ms, Number.isInteger(ms) ? 0 : 1)}
            {ms === ticks.at(-1) ? ' ms' : ''}
          </PictureText>
        </g>
      ))}
    </>
  );
}

/** For those who neither pinch nor know the keys. */
function ZoomButtons({
  moved,
  reset,
  zoomBy,
}: Pick<ReturnType<typeof useTraceView>, 'moved' | 'reset' | 'zoomBy'>) {
  return (
    <Flex gap="14px" justifyContent="flex-end" fontSize="caption" color="ink.muted">
      <TextButton onClick={() => zoomBy(0.6)}>closer</TextButton>
      <TextButton onClick={() => zoomBy(1 / 0.6)}>wider</TextButton>
      {moved && <TextButton onClick={reset}>as it was</TextButton>}
    </Flex>
  );
}

/** From the kick microphone's first arrival to the overhead's. */
function ArrivalBracket({
  arrivalMs,
  shiftMs,
  view,
  widthPx,
}: {
  arrivalMs: number | null;
  shiftMs: number;
  view: TraceView;
  widthPx: number;
}) {
  if (arrivalMs === null) return null;
  const x = xOfMs(view, widthPx);
  const to = x(arrivalMs - shiftMs);
  if (Math.abs(to - x(0)) < 6) return null;
  return (
    <>
      <path d={`M${x(0)} 16v-8H${to}v8`} fill="none" stroke={ink.ink} strokeWidth="1.5" />
      <PictureText
        x={Math.max(x(0), to) + 8}
        y={13}
        bold
        fill={ink.ink}
        paintOrder="stroke"
        stroke={ink.sheet}
        strokeWidth="5"
      >
        {milliseconds(Math.abs(arrivalMs - shiftMs))} {arrivalMs > shiftMs ? 'later' : 'earlier'}
      </PictureText>
    </>
  );
}

function describe(points: TracePoints, label: string): string {
  const share = Math.round(togetherShare(points) * 100);
  return `Kick and overhead around this hit, ${label}: they push the same way for ${share} % of what they share, and pull apart for the rest.`;
}
