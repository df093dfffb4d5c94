import { ink } from '../../sheet/pictures/ink';
import { halo, PictureText } from '../../sheet/pictures/PictureText';
import { usualKit } from '../setupGeometry';
import { kitAround, playerAt, snareDepthCm, type SetupLayout } from './setupLayout';

const { beater, kickDepthCm, kickRadiusCm, snare } = usualKit;
const snareRadiusCm = 18;
/** The hole in the front head, around its middle. */
const holeCm = { from: 22, to: 37 };
const drumPx = 2;
const cymbalPx = 1.3;

/** Drums heavy, cymbals light, the player dashed. */
export function KitFromAbove({ layout }: { layout: SetupLayout }) {
  const { xOf, yAboveOf, pxPerCm } = layout;
  const left = xOf(0);
  const hat = kitAround.find(({ name }) => name === 'hat') ?? snare;
  return (
    <g fill="none" stroke={ink.ink}>
      <rect
        x={left}
        y={yAboveOf(-kickRadiusCm)}
        width={kickDepthCm * pxPerCm}
        height={2 * kickRadiusCm * pxPerCm}
        rx="3"
        strokeWidth={drumPx}
      />
      {kitAround.map(({ name, frontCm, rightCm, radiusCm, isDrum }) => (
        <circle
          key={name}
          cx={xOf(frontCm)}
          cy={yAboveOf(rightCm)}
          r={radiusCm * pxPerCm}
          strokeWidth={isDrum ? drumPx : cymbalPx}
        />
      ))}
      <circle
        cx={xOf(playerAt.frontCm)}
        cy={yAboveOf(playerAt.rightCm)}
        r={playerAt.radiusCm * pxPerCm}
        strokeWidth={cymbalPx}
        strokeDasharray="4 3"
      />
      <g stroke="none" fill={ink.muted}>
        <PictureText x={xOf(hat.frontCm - snareRadiusCm) - 8} y={yAboveOf(hat.rightCm) + 4} textAnchor="end">
          hat
        </PictureText>
        <PictureText
          x={xOf(snare.frontCm - snareRadiusCm) - 8}
          y={yAboveOf(snare.rightCm) + 4}
          textAnchor="end"
        >
          snare
        </PictureText>
        <PictureText x={xOf(kickDepthCm) + 8} y={yAboveOf(-10)}>
          kick
        </PictureText>
        <PictureText x={xOf(playerAt.frontCm)} y={yAboveOf(playerAt.rightCm) + 4} textAnchor="middle">
          you
        </PictureText>
      </g>
    </g>
  );
}

export function KitFromSide({ layout }: { layout: SetupLayout }) {
  const { xOf, ySideOf, pxPerCm, floorY, widthPx } = layout;
  const [left, right] = [xOf(0), xOf(kickDepthCm)];
  const [top, bottom] = [ySideOf(2 * kickRadiusCm + 2), ySideOf(1)];
  const [floorFrom, floorTo] = [Math.max(0, xOf(-90)), Math.min(widthPx, xOf(75))];
  return (
    <g fill="none" stroke={ink.ink}>
      <path
        d={`M${right} ${ySideOf(holeCm.to)}V${top}H${left}V${bottom}H${right}V${ySideOf(holeCm.from)}`}
        strokeWidth={drumPx}
        strokeLinejoin="round"
      />
      <rect
        x={xOf(snare.frontCm - snareRadiusCm)}
        y={ySideOf(snare.upCm)}
        width={2 * snareRadiusCm * pxPerCm}
        height={snareDepthCm * pxPerCm}
        rx="2"
        strokeWidth={drumPx}
      />
      {kitAround.map(
        ({ name, frontCm, radiusCm, cymbalUpCm }) =>
          cymbalUpCm !== undefined && (
            <path
              key={name}
              d={`M${xOf(frontCm - radiusCm)} ${ySideOf(cymbalUpCm)}H${xOf(frontCm + radiusCm)}`}
              strokeWidth={drumPx}
            />
          ),
      )}
      <path d={`M${floorFrom} ${floorY}H${floorTo}`} strokeWidth={drumPx} />
      <g stroke="none" fill={ink.muted}>
        <PictureText x={floorFrom} y={floorY + 17} {...halo}>
          back
        </PictureText>
        <PictureText x={floorTo} y={floorY + 17} textAnchor="end" {...halo}>
          front
        </PictureText>
      </g>
    </g>
  );
}

/** Where the beater strikes, in both views. */
export const beaterAt = ({ xOf, yAboveOf, ySideOf }: SetupLayout) => ({
  above: { x: xOf(beater.frontCm), y: yAboveOf(beater.rightCm) },
  side: { x: xOf(beater.frontCm), y: ySideOf(beater.upCm) },
});
