import type { KitPlace } from '@thudline/contracts';
import { ink } from '../../sheet/pictures/ink';
import { kitPieces, type PlanLayout } from './planLayout';

/** The kit from above, turned as it stands, with the places of both microphones. */
export function KitOnPlan({
  plan,
  kit,
  outlined = false,
}: {
  plan: PlanLayout;
  kit: KitPlace;
  /** With the floor that the kit takes. */
  outlined?: boolean;
}) {
  const { x, y } = plan.at(kit);
  const { pxPerM } = plan;
  return (
    <g transform={`translate(${x} ${y}) rotate(${-kit.turnedDeg})`}>
      {outlined && (
        <rect
          x={-0.7 * pxPerM}
          y={-1 * pxPerM}
          width={1.7 * pxPerM}
          height={2 * pxPerM}
          fill="none"
          stroke={ink.muted}
          strokeDasharray="4 3"
        />
      )}
      {kitPieces.map((piece) => (
        <circle
          key={piece.name}
          cx={piece.xM * pxPerM}
          cy={-piece.yM * pxPerM}
          r={piece.radiusM * pxPerM}
          fill={ink.sheet}
          stroke={ink.ink}
          strokeWidth="1.4"
        />
      ))}
      <circle cx={0.55 * pxPerM} cy={0} r={2.8} fill={ink.kick} />
      <circle
        cx={0.2 * pxPerM}
        cy={-0.1 * pxPerM}
        r={2.8}
        fill={ink.sheet}
        stroke={ink.overhead}
        strokeWidth="1.6"
      />
    </g>
  );
}
