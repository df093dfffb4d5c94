import { ink } from '../../sheet/pictures/ink';
import { PictureText } from '../../sheet/pictures/PictureText';
import {
  changeMarks,
  smallBand,
  type ChangeAxis,
  type ChangeMarks,
  type DrawnFigure,
} from './changeRowsLayout';

const heightPx = 28;
const y = heightPx / 2;

/** Ring, arrow and disc of one change over the band of what is too small to mention; a question mark where it can't be told. */
export function ChangeMarksRow({ figure, axis }: { figure: DrawnFigure; axis: ChangeAxis }) {
  const marks = changeMarks(figure, axis);
  const band = smallBand(axis);
  const middle = axis.widthPx / 2;
  return (
    <svg width={axis.widthPx} height={heightPx} aria-hidden style={{ display: 'block' }}>
      <rect x={band.fromX} width={band.toX - band.fromX} height={heightPx} fill={ink.target} />
      {marks?.interval && (
        <rect
          x={marks.interval.fromX}
          y={y - 6}
          width={Math.max(2, marks.interval.toX - marks.interval.fromX)}
          height={12}
          fill={ink.together}
        />
      )}
      {marks && <path d={`M${middle} 0V${heightPx}`} stroke={ink.ink} strokeWidth="1.6" />}
      {marks ? (
        <>
          <circle cx={marks.ringX} cy={y} r={6} fill={ink.sheet} stroke={ink.ink} strokeWidth="2.2" />
          {marks.arrow && <Arrow {...marks.arrow} />}
          <circle cx={marks.discX} cy={y} r={inRing(marks) ? 3 : 5.2} fill={ink.ink} />
        </>
      ) : (
        <PictureText x={middle} y={y + 5} textAnchor="middle" fontSize={15} bold fill={ink.muted}>
          ?
        </PictureText>
      )}
    </svg>
  );
}

/** Where nothing moved the ring is still to be seen. */
const inRing = ({ discX, ringX }: ChangeMarks) => Math.abs(discX - ringX) < 3;

function Arrow({ fromX, toX }: { fromX: number; toX: number }) {
  const back = Math.sign(fromX - toX) * 6;
  return (
    <path
      d={`M${fromX} ${y}H${toX}M${toX + back} ${y - 5}L${toX} ${y}L${toX + back} ${y + 5}`}
      fill="none"
      stroke={ink.ink}
      strokeWidth="1.8"
    />
  );
}
