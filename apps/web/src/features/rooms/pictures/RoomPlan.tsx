import { Box } from '@chakra-ui/react';
import type { RoomChangeResponse, RoomResponse } from '@thudline/contracts';
import { useWidth } from '../../../lib/useWidth';
import { ink } from '../../sheet/pictures/ink';
import { KitOnPlan } from './KitOnPlan';
import { NumberRing } from './NumberRing';
import { planLayout } from './planLayout';

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
          {room.kit && <KitOnPlan plan={plan} kit={room.kit} outlined />}
          {placed.map(({ id, number, place }) => {
            const at = plan.at(place!);
            return <NumberRing key={id} number={number} {...at} />;
          })}
        </svg>
      )}
    </Box>
  );
}

function describe({ name, kit }: RoomResponse, placed: readonly RoomChangeResponse[]): string {
  const marks = placed.map(({ number, what }) => `${number}, ${what}`).join('; ');
  return `${name} from above, to scale${kit ? ', with the kit' : ''}.${marks ? ` Changes: ${marks}.` : ''}`;
}
