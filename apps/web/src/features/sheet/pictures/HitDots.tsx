import { number, plural } from '../../../lib/format';
import { dotSizes, rowHeightPx, type Dot, type StripScale } from './hitStripLayout';
import { ink } from './ink';
import { halo, PictureText } from './PictureText';

interface HitDotsProps {
  role: 'kick' | 'overhead';
  y: number;
  x: StripScale;
  dots: readonly Dot[];
  /** The take clipped in this microphone: its hardest level can't be told. */
  clipped: boolean;
  chosenHit?: number | null;
}

/** One microphone's line: its name, a dot per hit, the hardest with its level. */
export function HitDots({ role, y, x, dots, clipped, chosenHit = null }: HitDotsProps) {
  const hardest = dots.find((dot) => dot.hardest);
  return (
    <>
      <PictureText x={0} y={y - 4} fontSize={15} bold fill={ink[role]}>
        {role}
      </PictureText>
      <PictureText x={0} y={y + 13} fill={ink.muted}>
        {dots.length === 0 ? 'no hit' : plural(dots.length, 'hit')}
      </PictureText>
      <path d={`M${x.left} ${y}H${x.right}`} stroke={ink.rule} strokeWidth="1.2" />
      {dots.map((dot) => (
        <DotMark key={dot.index} dot={dot} y={y} role={role} chosen={dot.index === chosenHit} />
      ))}
      {hardest && !clipped && (
        <HardestLabel dot={hardest} y={y} role={role} x={x} rowsBelow={rowsUnder(dots, hardest)} />
      )}
    </>
  );
}

/** How many rows hang under the hardest hit, where its label may have to go. */
const rowsUnder = (dots: readonly Dot[], hardest: Dot) =>
  Math.max(0, ...dots.filter((dot) => Math.abs(dot.x - hardest.x) < 44).map((dot) => dot.row));

function DotMark({
  dot,
  y,
  role,
  chosen,
}: {
  dot: Dot;
  y: number;
  role: 'kick' | 'overhead';
  chosen: boolean;
}) {
  const r = dot.hardest ? dotSizes.hardestRadiusPx : dotSizes.dotRadiusPx;
  const cy = y + dot.row * rowHeightPx;
  const ring = role === 'overhead';
  if (dot.clipped)
    return (
      <>
        {chosen && <circle cx={dot.x} cy={cy} r={9} fill="none" stroke={ink.ink} strokeWidth="1.6" />}
        <path d={`M${dot.x - 4.6} ${cy - 4.6}l9.2 9.2m0-9.2l-9.2 9.2`} stroke={ink[role]} strokeWidth="2.6" />
      </>
    );
  return (
    <>
      {chosen && <circle cx={dot.x} cy={cy} r={r + 3.4} fill="none" stroke={ink.ink} strokeWidth="1.6" />}
      <circle
        cx={dot.x}
        cy={cy}
        r={ring ? r - 0.9 : r}
        fill={ring ? ink.sheet : ink.kick}
        stroke={ring ? ink.overhead : 'none'}
        strokeWidth={ring ? 1.9 : 0}
      />
    </>
  );
}

function HardestLabel({
  dot,
  y,
  role,
  x,
  rowsBelow,
}: {
  dot: Dot;
  y: number;
  role: 'kick' | 'overhead';
  x: StripScale;
  rowsBelow: number;
}) {
  const fitsRight = dot.x + 45 < x.right;
  return (
    <PictureText
      x={fitsRight ? dot.x + 13 : x.right - 4}
      y={fitsRight ? y + 5 : y + 20 + rowsBelow * rowHeightPx}
      textAnchor={fitsRight ? 'start' : 'end'}
      fontSize={15}
      bold
      fill={ink[role]}
      {...halo}
    >
      {number(dot.peakDbfs)}
    </PictureText>
  );
}
