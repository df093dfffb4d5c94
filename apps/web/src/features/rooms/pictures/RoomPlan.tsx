import { Box } from '@chakra-ui/react';
import type { RoomChangeResponse, RoomResponse } from '@thudline/contracts';
import { useWidth } from '../../../lib/useWidth';
import { ink } from '../../sheet/pictures/ink';
import { NumberRing } from './NumberRing';
import { kitPieces, planLayout, type PlanLayout } from './planLayout';

/** The room from above, to scale, with the kit and the changes where they were made. */
export function RoomPlan({ room, changes }: { room: RoomResponse; changes: readonly RoomChangeResponse[] }) {
  const { ref, widthPx } = useWidth<HTMLDivElement>(288);
  const plan = planLayout(room.shape, widthPx);
  const placed = changes.filter(({ place }) => place !== null);
  return (
    <Box ref={ref}>
      {plan && (
        <svg
          width={plan.widthPx}
          height={plan.heightPx}
          role="img"
          aria-label={describe(room, placed)}
          style={{ display: 'block' }}
        >
          <rect
            x="1.5"
            y="1.5"
            width={plan.widthPx - 3}
            height={plan.heightPx - 3}
            fill={ink.target}
            stroke={ink.ink}
            strokeWidth="3"
          />
          {room.kit && <Kit plan={plan} kit={room.kit} />}
          {placed.map(({ id, number, place }) => {
            const at = plan.at(place!);
            return <NumberRing key={id} number={number} {...at} />;
          })}
        </svg>
      )}
    </Box>
  );
}

function Kit({ plan, kit }: { plan: PlanLayout; kit: NonNullable<RoomResponse['kit']> }) {
  const { x, y } = plan.at(kit);
  const { pxPerM } = plan;
  return (
    <g transform={`translate(${x} ${y}) rotate(${-kit.turnedDeg})`}>
      <rect
        x={-0.7 * pxPerM}
        y={-1 * pxPerM}
        width={1.7 * pxPerM}
        height={2 * pxPerM}
        fill="none"
        stroke={ink.muted}
        strokeDasharray="4 3"
      />
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

function describe({ name, kit }: RoomResponse, placed: readonly RoomChangeResponse[]): string {
  const marks = placed.map(({ number, what }) => `${number}, ${what}`).join('; ');
  return `${name} from above, to scale${kit ? ', with the kit' : ''}.${marks ? ` Changes: ${marks}.` : ''}`;
}
