import { Box } from '@chakra-ui/react';
import type { RoomMode } from '@thudline/dsp';
import { useId } from 'react';
import { number, plural } from '../../../lib/format';
import { useWidth } from '../../../lib/useWidth';
import { Hatch } from '../../sheet/pictures/Hatch';
import { ink } from '../../sheet/pictures/ink';
import { halo, PictureText } from '../../sheet/pictures/PictureText';
import { alongWords, groupWords } from '../calculatorWords';
import { modeKey, type RoomResonances } from '../roomResonances';
import { modeStripLayout, nearestMode, strokePx, wordsX, type ModeStripLayout } from './modeStripLayout';

const axisY = 86;
const heightPx = 110;
const groupWordsY = 22;
const hatchTopY = 28;

/** A room's lowest modes along an axis of frequency; a click chooses the nearest. The list beside the plan does it by key. */
export function ModeStrip({
  resonances,
  chosen,
  onChoose,
}: {
  resonances: RoomResonances;
  chosen: RoomMode;
  onChoose: (mode: RoomMode) => void;
}) {
  const { ref, widthPx } = useWidth<HTMLDivElement>();
  const hatchId = useId();
  const layout = modeStripLayout(resonances.all, { widthPx, toHz: resonances.shownToHz });
  return (
    <Box ref={ref} marginTop="8px">
      <svg
        width={widthPx}
        height={heightPx}
        role="img"
        aria-label={describe(resonances, layout.strokes.length, chosen)}
        style={{ display: 'block', cursor: 'pointer' }}
        onClick={(event) => {
          const { left } = event.currentTarget.getBoundingClientRect();
          const mode = nearestMode(layout, event.clientX - left);
          if (mode) onChoose(mode);
        }}
      >
        <defs>
          <Hatch id={hatchId} color={ink.hatch} />
        </defs>
        {resonances.boom && <Boom {...{ group: resonances.boom, layout, widthPx, hatchId }} />}
        <Axis layout={layout} widthPx={widthPx} />
        {layout.strokes.map(({ mode, x }) => (
          <path
            key={modeKey(mode)}
            d={`M${x} ${axisY}v${-strokePx[mode.kind].heightPx}`}
            stroke={ink.ink}
            strokeWidth={strokePx[mode.kind].widthPx}
          />
        ))}
        <Lowest {...{ resonances, layout, widthPx, chosen }} />
        <circle
          cx={layout.x(chosen.frequencyHz)}
          cy={axisY - strokePx[chosen.kind].heightPx}
          r={6}
          fill={ink.ink}
        />
      </svg>
    </Box>
  );
}

function Boom({
  group,
  layout,
  widthPx,
  hatchId,
}: {
  group: readonly RoomMode[];
  layout: ModeStripLayout;
  widthPx: number;
  hatchId: string;
}) {
  const fromX = layout.x(group[0].frequencyHz) - 6;
  const toX = layout.x(group[group.length - 1].frequencyHz) + 6;
  const words = groupWords(group);
  return (
    <>
      <rect
        x={fromX}
        y={hatchTopY}
        width={toX - fromX}
        height={axisY - hatchTopY}
        fill={`url(#${hatchId})`}
      />
      <PictureText x={wordsX(fromX, words, widthPx)} y={groupWordsY} bold fill={ink.ink}>
        {words}
      </PictureText>
    </>
  );
}

function Axis({ layout, widthPx }: { layout: ModeStripLayout; widthPx: number }) {
  return (
    <>
      <path d={`M0 ${axisY}H${widthPx}`} stroke={ink.ink} strokeWidth="1.6" />
      {layout.ticks.map(({ hz, x, text }) => (
        <g key={hz}>
          <path d={`M${x} ${axisY}v5`} stroke={ink.muted} />
          <PictureText
            x={Math.min(x, widthPx - text.length * 3.6)}
            y={axisY + 20}
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

/** The lowest is named, where its words run into nothing. */
function Lowest({
  resonances,
  layout,
  chosen,
}: {
  resonances: RoomResonances;
  layout: ModeStripLayout;
  chosen: RoomMode;
}) {
  const [first, second] = layout.strokes;
  const words = `${number(first.mode.frequencyHz, 1)} ${first.mode.order[2] > 0 ? 'floor to ceiling' : 'end to end'}`;
  const runsIntoNext = second && second.x < first.x + 10 + words.length * 6.4;
  const isBoom = resonances.boom?.includes(first.mode) ?? false;
  if (runsIntoNext || isBoom || chosen === first.mode) return null;
  return (
    <PictureText x={first.x + 8} y={axisY - 40} fill={ink.muted} {...halo}>
      {words}
    </PictureText>
  );
}

function describe({ boom, shownToHz }: RoomResonances, count: number, chosen: RoomMode): string {
  return [
    `${plural(count, 'resonance')} up to ${number(shownToHz, 0)} Hz.`,
    boom && `${groupWords(boom)}.`,
    `Chosen: ${number(chosen.frequencyHz, 1)} Hz, ${alongWords(chosen)}.`,
  ]
    .filter(Boolean)
    .join(' ');
}
