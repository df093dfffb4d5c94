import { Box } from '@chakra-ui/react';
import type { PlanPlace, RoomResponse } from '@thudline/contracts';
import type { PointerEvent } from 'react';
import { useWidth } from '../../../lib/useWidth';
import { ink } from '../../sheet/pictures/ink';
import { planLayout, planPlace } from '../pictures/planLayout';

const crossPx = 7;

/** The room's plan to point at. For pointers only: the two numbers beside it say the same to everybody. */
export function PlaceOnPlan({
  room,
  place,
  onPlace,
}: {
  room: RoomResponse;
  place: PlanPlace | null;
  onPlace: (place: PlanPlace) => void;
}) {
  const { ref, widthPx } = useWidth<HTMLDivElement>(300);
  const plan = planLayout(room.shape, Math.min(widthPx, 320), 180);
  const point = (event: PointerEvent<SVGSVGElement>) => {
    if (!plan) return;
    const { left, top } = event.currentTarget.getBoundingClientRect();
    onPlace(planPlace(plan, room.shape, { x: event.clientX - left, y: event.clientY - top }));
  };
  const at = plan && place ? plan.at(place) : null;
  const kit = plan && room.kit ? plan.at(room.kit) : null;
  return (
    <Box ref={ref}>
      {plan && (
        <svg
          width={plan.widthPx}
          height={plan.heightPx}
          aria-hidden
          style={{ display: 'block', cursor: 'crosshair', touchAction: 'none' }}
          onPointerDown={point}
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
          {kit && (
            <circle
              cx={kit.x}
              cy={kit.y}
              r={0.7 * plan.pxPerM}
              fill="none"
              stroke={ink.muted}
              strokeDasharray="4 3"
            />
          )}
          {at && (
            <path
              d={`M${at.x - crossPx} ${at.y}h${2 * crossPx}M${at.x} ${at.y - crossPx}v${2 * crossPx}`}
              stroke={ink.ink}
              strokeWidth="2.4"
            />
          )}
        </svg>
      )}
    </Box>
  );
}
