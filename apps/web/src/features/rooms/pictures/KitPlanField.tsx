import { Box, chakra } from '@chakra-ui/react';
import type { KitPlace, RoomResponse } from '@thudline/contracts';
import type { KeyboardEvent, MouseEvent } from 'react';
import { useWidth } from '../../../lib/useWidth';
import { ink } from '../../sheet/pictures/ink';
import { placeWords } from '../roomWords';
import { KitOnPlan } from './KitOnPlan';
import { planLayout, planPlace } from './planLayout';

const gripPx = 56;
const stepM = 0.1;
const bigStepM = 0.5;
const ways: Record<string, { x: number; y: number }> = {
  ArrowRight: { x: 1, y: 0 },
  ArrowLeft: { x: -1, y: 0 },
  ArrowUp: { x: 0, y: 1 },
  ArrowDown: { x: 0, y: -1 },
};

/** The plan to scale with the kit to take hold of; a press on the plan puts it there. */
export function KitPlanField({
  shape,
  kit,
  lengthUnit,
  onMove,
}: {
  shape: RoomResponse['shape'];
  kit: KitPlace | null;
  lengthUnit: 'metre' | 'foot';
  onMove: (place: { xM: number; yM: number }) => void;
}) {
  const { ref, widthPx } = useWidth<HTMLDivElement>(400);
  const plan = planLayout(shape, widthPx);
  if (!plan) return <Box ref={ref} />;
  const moveTo = (event: MouseEvent) => {
    const box = ref.current?.getBoundingClientRect();
    if (box) onMove(planPlace(plan, shape, { x: event.clientX - box.left, y: event.clientY - box.top }));
  };
  const keyMove = (event: KeyboardEvent) => {
    const way = ways[event.key];
    if (!way || !kit) return;
    event.preventDefault();
    const far = event.shiftKey ? bigStepM : stepM;
    const to = plan.at({ xM: Math.max(0, kit.xM + way.x * far), yM: Math.max(0, kit.yM + way.y * far) });
    onMove(planPlace(plan, shape, to));
  };
  const at = kit && plan.at(kit);
  return (
    <Box ref={ref} position="relative" touchAction="pan-y">
      <svg
        width={plan.widthPx}
        height={plan.heightPx}
        aria-hidden
        style={{ display: 'block', cursor: 'crosshair' }}
        onClick={moveTo}
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
        {kit && <KitOnPlan plan={plan} kit={kit} outlined />}
      </svg>
      {kit && at && (
        <chakra.button
          type="button"
          aria-label={`Kit, ${placeWords(kit, lengthUnit)}. The arrow keys move it.`}
          position="absolute"
          left={`${at.x - gripPx / 2}px`}
          top={`${at.y - gripPx / 2}px`}
          width={`${gripPx}px`}
          height={`${gripPx}px`}
          borderRadius="50%"
          cursor="grab"
          touchAction="none"
          onPointerDown={(event) => event.currentTarget.setPointerCapture(event.pointerId)}
          onPointerMove={(event) => {
            if (event.currentTarget.hasPointerCapture(event.pointerId)) moveTo(event);
          }}
          onKeyDown={keyMove}
        />
      )}
    </Box>
  );
}
