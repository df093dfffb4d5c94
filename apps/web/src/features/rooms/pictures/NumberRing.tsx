import { ink } from '../../sheet/pictures/ink';
import { PictureText } from '../../sheet/pictures/PictureText';

/** A change's number, as it stands in the log, above the trend and on the plan. */
export function NumberRing({ number, x, y }: { number: number; x: number; y: number }) {
  return (
    <g>
      <circle cx={x} cy={y} r={11} fill={ink.sheet} stroke={ink.ink} strokeWidth="1.8" />
      <PictureText x={x} y={y + 4.5} textAnchor="middle" bold fill={ink.ink}>
        {number}
      </PictureText>
    </g>
  );
}
