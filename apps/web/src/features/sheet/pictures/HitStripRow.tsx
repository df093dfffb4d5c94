import { Box, chakra } from '@chakra-ui/react';
import type { Target, TrackReport } from '@thudline/contracts';
import { useId, useMemo, useState, type KeyboardEvent } from 'react';
import { number } from '../../../lib/format';
import { HitDots } from './HitDots';
import {
  changeLabel,
  rowHeightPx,
  stackDots,
  stripHeightPx,
  type Dot,
  type StripHit,
  type StripScale,
} from './hitStripLayout';
import { ink } from './ink';
import { halo, PictureText } from './PictureText';

interface RowProps {
  role: 'kick' | 'overhead';
  y: number;
  hits: StripHit[];
  track: TrackReport;
  /** A low take that is good as it is: the change only could be made. */
  quiet: boolean;
  target: Target;
  widthPx: number;
  x: StripScale;
  chosenHit: number | null;
  onChoose: (hitIndex: number) => void;
}

/** One microphone's line with dots that can be chosen, and the arrow from the hardest hit to the aim. */
export function HitStripRow({
  role,
  y,
  hits,
  track,
  quiet,
  target,
  widthPx,
  x,
  chosenHit,
  onChoose,
}: RowProps) {
  const dots = useMemo(() => stackDots(hits, x), [hits, x]);
  const hardest = dots.find((dot) => dot.hardest);
  const clipped = track.level === 'clipped';
  return (
    <>
      <chakra.svg
        position="absolute"
        inset="0"
        width={`${widthPx}px`}
        height={`${stripHeightPx}px`}
        aria-hidden
        pointerEvents="none"
      >
        <HitDots {...{ role, y, x, dots, clipped, chosenHit }} />
        {hardest && (
          <GainArrow {...{ y, x, track, quiet, target, clipped, fromDbfs: clipped ? 0 : hardest.peakDbfs }} />
        )}
      </chakra.svg>
      <DotButtons {...{ dots, y, role, chosenHit, onChoose }} />
    </>
  );
}

/** From the hardest hit to the aim, above the dots; nothing where the preamp stays where it is. */
function GainArrow({
  y,
  x,
  track,
  quiet,
  target,
  clipped,
  fromDbfs,
}: Pick<RowProps, 'y' | 'x' | 'track' | 'quiet' | 'target'> & { clipped: boolean; fromDbfs: number }) {
  if (track.gainChangeDb === null || track.level === null || track.level === 'on-target') return null;
  const from = x(fromDbfs);
  const to = x(target.aimDbfs);
  const way = Math.sign(to - from);
  const color = track.level !== 'low' ? ink.fix : quiet ? ink.muted : ink.watch;
  const arrowY = y - 23;
  const labelLeft = way < 0;
  return (
    <>
      <path
        d={`M${from} ${y - 8}V${arrowY - 4}M${from} ${arrowY}H${to}m${-6 * way}-5l${6 * way} 5l${-6 * way} 5`}
        fill="none"
        stroke={color}
        strokeWidth="1.9"
      />
      <PictureText
        x={to + 7 * way}
        y={arrowY + 4.5}
        textAnchor={labelLeft ? 'end' : 'start'}
        bold
        fill={color}
        {...halo}
      >
        {changeLabel(track.gainChangeDb, clipped)}
      </PictureText>
    </>
  );
}

/** The dots as targets of 24 px for pointer and keys: one stop for Tab, arrows walk from hit to hit by level. */
function DotButtons({
  dots,
  y,
  role,
  chosenHit,
  onChoose,
}: Pick<RowProps, 'y' | 'role' | 'chosenHit' | 'onChoose'> & { dots: Dot[] }) {
  const id = useId();
  const ordered = useMemo(() => [...dots].sort((a, b) => a.peakDbfs - b.peakDbfs), [dots]);
  const [focused, setFocused] = useState<number | null>(null);
  const tabStop = ordered.find((dot) => dot.index === (focused ?? chosenHit)) ?? ordered.at(-1);
  const onKeyDown = (event: KeyboardEvent<HTMLElement>, at: number) => {
    const step = event.key === 'ArrowRight' ? 1 : event.key === 'ArrowLeft' ? -1 : 0;
    const next = ordered[at + step];
    if (step === 0 || !next) return;
    event.preventDefault();
    setFocused(next.index);
    document.getElementById(`${id}-${next.index}`)?.focus();
  };
  return (
    <Box role="group" aria-label={`${role} hits by level`} _print={{ display: 'none' }}>
      {ordered.map((dot, at) => (
        <chakra.button
          key={dot.index}
          id={`${id}-${dot.index}`}
          position="absolute"
          left={`${dot.x - 12}px`}
          top={`${y + dot.row * rowHeightPx - 12}px`}
          width="24px"
          height="24px"
          borderRadius="50%"
          cursor="pointer"
          tabIndex={dot === tabStop ? 0 : -1}
          aria-pressed={dot.index === chosenHit}
          aria-label={`${role} hit ${dot.clipped ? 'clipped' : `${number(dot.peakDbfs)} dBFS`}`}
          title={dot.clipped ? 'clipped' : `${number(dot.peakDbfs)} dBFS`}
          onKeyDown={(event) => onKeyDown(event, at)}
          onFocus={() => setFocused(dot.index)}
          onClick={() => onChoose(dot.index)}
        />
      ))}
    </Box>
  );
}
