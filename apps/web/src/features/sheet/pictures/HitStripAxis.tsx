import type { Target } from '@thudline/contracts';
import { number } from '../../../lib/format';
import { Hatch } from './Hatch';
import type { StripScale } from './hitStripLayout';
import { ink } from './ink';
import { PictureText } from './PictureText';

export const axisY = 155;
const bandTop = 24;
/** Nearer to the aim than this a number would run into its word. */
const besideAimPx = 24;
/** Between grips closer than this the word "target" has no room. */
const besideGripsPx = 72;

/** Target band, aim, axis and the hatched edge where it clips. */
export function HitStripAxis({
  widthPx,
  x,
  hatchId,
  target,
  ticks,
  caption = widthPx < 480 ? 'dot = hit' : 'a dot = a hit',
  grips = false,
}: {
  widthPx: number;
  x: StripScale;
  hatchId: string;
  target: Target;
  ticks: number[];
  /** Stands at the left below the axis. */
  caption?: string;
  /** The ends of the target and the aim are drawn by something that can be moved. */
  grips?: boolean;
}) {
  const low = x(target.lowDbfs);
  const high = x(target.highDbfs);
  return (
    <>
      <defs>
        <Hatch id={hatchId} color={ink.fix} />
      </defs>
      <rect x={low} y={bandTop} width={high - low} height={axisY - bandTop} fill={ink.target} />
      <path
        d={`M${low} ${bandTop - 6}V${axisY}M${high} ${bandTop - 6}V${axisY}`}
        stroke={ink.ink}
        strokeWidth="1.2"
      />
      {(!grips || high - low > besideGripsPx) && (
        <PictureText x={(low + high) / 2} y={14} textAnchor="middle" bold fill={ink.ink}>
          target
        </PictureText>
      )}
      <rect
        x={x(0)}
        y={bandTop}
        width={widthPx - x(0)}
        height={axisY - bandTop}
        fill={`url(#${hatchId})`}
        opacity="0.55"
      />
      <path d={`M${x(0)} ${bandTop - 6}V${axisY}`} stroke={ink.fix} strokeWidth="1.6" />
      <PictureText x={widthPx} y={14} textAnchor="end" bold fill={ink.fix}>
        clips
      </PictureText>
      <path d={`M${x.left} ${axisY}H${x.right}`} stroke={ink.edge} strokeWidth="1.4" />
      {ticks.map((tick) => (
        <g key={tick}>
          <path d={`M${x(tick)} ${axisY - 4}v8`} stroke={ink.edge} strokeWidth="1.2" />
          {Math.abs(x(tick) - x(target.aimDbfs)) >= besideAimPx && (
            <PictureText x={x(tick)} y={172} textAnchor="middle" fill={ink.muted}>
              {number(tick, 0)}
              {tick === 0 && widthPx >= 480 ? ' dBFS' : ''}
            </PictureText>
          )}
        </g>
      ))}
      {!grips && <path d={`M${x(target.aimDbfs)} ${axisY - 10}l4 6.5h-8z`} fill={ink.ink} />}
      <PictureText x={x(target.aimDbfs)} y={172} textAnchor="middle" bold fill={ink.ink}>
        aim
      </PictureText>
      <PictureText x={0} y={172} fill={ink.muted}>
        {caption}
      </PictureText>
    </>
  );
}
