import { Box, chakra } from '@chakra-ui/react';
import type { UserSettings } from '@thudline/contracts';
import { useId } from 'react';
import { useWidth } from '../../../lib/useWidth';
import { ink } from '../../sheet/pictures/ink';
import { halo, PictureText } from '../../sheet/pictures/PictureText';
import { distanceAxis } from './distanceAxis';
import { wordSides } from './wordSides';

/** One mark of the line: where it stands and what is written at it. */
interface LineMark {
  lengthCm: number;
  words: string;
}

interface DistanceLineProps {
  /** What the tape says: the ring. */
  numbers: LineMark | null;
  /** What the sound says: the disc, with how far its hits differ. */
  measured: (LineMark & { spreadCm: number }) | null;
  lengthUnit: UserSettings['lengthUnit'];
}

const edgePx = 7;

/** How much later the overhead hears the kick, as distance: by the numbers, and as measured. */
export function DistanceLine({ numbers, measured, lengthUnit }: DistanceLineProps) {
  const { ref, widthPx } = useWidth<HTMLDivElement>();
  const id = useId();
  const marks = [measured, numbers].flatMap((mark) => mark ?? []);
  const { ticks, shareOf } = distanceAxis(
    marks.map(({ lengthCm }) => lengthCm),
    lengthUnit,
  );
  const xOf = (share: number) => edgePx + share * (widthPx - 2 * edgePx);
  const at = (lengthCm: number) => xOf(shareOf(lengthCm));
  const sides = wordSides(
    marks.map(({ lengthCm, words }) => ({ x: at(lengthCm), words })),
    widthPx,
  );
  const lineY = sides ? 48 : 72;
  const placed = marks.map((mark, i) => ({
    ...mark,
    x: at(mark.lengthCm),
    side: sides?.[i] ?? null,
    row: i,
  }));
  return (
    <Box marginTop="22px">
      <chakra.h2 id={id} fontSize="small" lineHeight="20px" fontWeight={600}>
        How much later the overhead hears the kick, as distance
      </chakra.h2>
      <Box ref={ref} marginTop="10px">
        <svg
          width={widthPx}
          height={lineY + 28}
          role="img"
          aria-label={marks.map(({ words }) => words).join('; ') || 'Nothing to show yet.'}
          style={{ display: 'block', fontVariantNumeric: 'tabular-nums' }}
        >
          {measured && (
            <rect
              x={at(measured.lengthCm - measured.spreadCm)}
              y={lineY - 6}
              width={Math.max(
                0,
                at(measured.lengthCm + measured.spreadCm) - at(measured.lengthCm - measured.spreadCm),
              )}
              height={12}
              fill={ink.together}
            />
          )}
          <path d={`M${edgePx} ${lineY}H${widthPx - edgePx}`} stroke={ink.rule} />
          {ticks.map(({ share, label }, i) => (
            <g key={label}>
              <path d={`M${xOf(share)} ${lineY - 4}v8`} stroke={ink.muted} />
              <PictureText
                x={i === 0 ? 0 : i === ticks.length - 1 ? widthPx : xOf(share)}
                y={lineY + 24}
                textAnchor={i === 0 ? 'start' : i === ticks.length - 1 ? 'end' : 'middle'}
                fill={ink.muted}
              >
                {label}
              </PictureText>
            </g>
          ))}
          {placed.map((mark) => (
            <MarkWords key={mark.words} mark={mark} lineY={lineY} isRing={mark.words === numbers?.words} />
          ))}
          {placed.map(({ x, words }) => (
            <Mark key={words} x={x} y={lineY} isRing={words === numbers?.words} />
          ))}
        </svg>
      </Box>
    </Box>
  );
}

interface PlacedMark extends LineMark {
  x: number;
  /** Null where the words stand in rows of their own. */
  side: 'left' | 'right' | null;
  row: number;
}

/** The words at a mark with the line that joins them, or in a row of their own behind the mark they are of. */
function MarkWords({ mark, lineY, isRing }: { mark: PlacedMark; lineY: number; isRing: boolean }) {
  const { words, x, side, row } = mark;
  if (side === null)
    return (
      <>
        <Mark x={edgePx} y={14 + row * 21} isRing={isRing} />
        <PictureText x={edgePx + 14} y={19 + row * 21} bold fill={ink.ink}>
          {words}
        </PictureText>
      </>
    );
  const outward = side === 'left' ? -1 : 1;
  const toX = x + outward * 13;
  return (
    <>
      <path
        d={`M${toX - outward * 2} 21L${x + outward * 3} ${lineY - 7}`}
        stroke={ink.ink}
        strokeWidth="1.2"
      />
      <PictureText
        x={toX}
        y={22}
        textAnchor={side === 'left' ? 'end' : 'start'}
        bold
        fill={ink.ink}
        {...halo}
      >
        {words}
      </PictureText>
    </>
  );
}

function Mark({ x, y, isRing }: { x: number; y: number; isRing: boolean }) {
  return isRing ? (
    <circle cx={x} cy={y} r="6.5" fill={ink.sheet} stroke={ink.ink} strokeWidth="2.4" />
  ) : (
    <circle cx={x} cy={y} r="6" fill={ink.ink} />
  );
}
