import { Box } from '@chakra-ui/react';
import type { RoomResponse } from '@thudline/contracts';
import type { RoomMode, RoomSize } from '@thudline/dsp';
import { number } from '../../../lib/format';
import { useWidth } from '../../../lib/useWidth';
import { KitOnPlan } from '../../rooms/pictures/KitOnPlan';
import { planLayout, type PlanLayout } from '../../rooms/pictures/planLayout';
import { ink } from '../../sheet/pictures/ink';
import { PictureText } from '../../sheet/pictures/PictureText';
import { lengthWords, spotOnPlanWords, type LengthUnit } from '../calculatorWords';
import type { KnownSurface } from '../knownRoom';
import type { TreatmentPlan } from '../treatmentPlan';
import { edgeWords, modeZones } from './modeZones';
import { OnWalls } from './OnWalls';
import { doorsInWalls, plannedFlat, plannedOnWalls, softOnWalls } from './wallStretches';

const topPx = 20;
const bottomPx = 24;
/** For the width, beside the plan. */
const rightPx = 58;
/** For "strong" and "none" beside the plan, where the mode has them there. */
const leftWordsPx = 46;
const mostHeightPx = 300;

interface ModePlanProps {
  room: RoomResponse;
  size: RoomSize;
  surfaces: readonly KnownSurface[];
  mode: RoomMode;
  plan: TreatmentPlan;
  lengthUnit: LengthUnit;
}

/** The room from above, to scale: where the chosen mode is strong and where there is none, the kit, what is planned. */
export function ModePlan({ room, size, surfaces, mode, plan, lengthUnit }: ModePlanProps) {
  const { ref, widthPx } = useWidth<HTMLDivElement>(470);
  const leftPx = mode.order[1] > 0 ? leftWordsPx : 0;
  const layout = planLayout(room.shape, widthPx - leftPx - rightPx, mostHeightPx);
  if (!layout) return null;
  const flat = plannedFlat(plan, size);
  return (
    <Box ref={ref} minWidth={0}>
      <svg
        width={widthPx}
        height={layout.heightPx + topPx + bottomPx}
        role="img"
        aria-label={describe(room, mode, plan)}
        style={{ display: 'block' }}
      >
        <g transform={`translate(${leftPx} ${topPx})`}>
          <Zones mode={mode} layout={layout} size={size} />
          <rect
            x="1.5"
            y="1.5"
            width={layout.widthPx - 3}
            height={layout.heightPx - 3}
            fill="none"
            stroke={ink.ink}
            strokeWidth="3"
          />
          <OnWalls look="door" stretches={doorsInWalls(surfaces, size)} {...{ layout, size }} />
          <OnWalls look="soft" stretches={softOnWalls(surfaces, size)} {...{ layout, size }} />
          <OnWalls look="planned" stretches={plannedOnWalls(plan, size)} {...{ layout, size }} />
          {flat && (
            <rect
              x={(layout.widthPx - flat.lengthM * layout.pxPerM) / 2}
              y={(layout.heightPx - flat.widthM * layout.pxPerM) / 2}
              width={flat.lengthM * layout.pxPerM - 8}
              height={flat.widthM * layout.pxPerM - 8}
              transform="translate(4 4)"
              fill="none"
              stroke={ink.ink}
              strokeWidth="1.6"
              strokeDasharray="8 3"
            />
          )}
          {room.kit && <KitOnPlan plan={layout} kit={room.kit} />}
          <EdgeWords mode={mode} layout={layout} />
          <PictureText
            x={layout.widthPx / 2}
            y={layout.heightPx + 19}
            textAnchor="middle"
            bold
            fill={ink.ink}
          >
            {lengthWords(size.lengthM, lengthUnit)}
          </PictureText>
          <PictureText x={layout.widthPx + 7} y={layout.heightPx / 2 + 5} bold fill={ink.ink}>
            {lengthWords(size.widthM, lengthUnit)}
          </PictureText>
        </g>
      </svg>
    </Box>
  );
}

const levelOpacity = [0, 0.22, 0.45, 0.7, 1];

function Zones({ mode, layout, size }: { mode: RoomMode; layout: PlanLayout; size: RoomSize }) {
  const { zones, nonesAlongLength, nonesAlongWidth } = modeZones(mode.order);
  const at = (x: number, y: number) => layout.at({ xM: x * size.lengthM, yM: y * size.widthM });
  const [topLeft, bottomRight] = [at(0, 1), at(1, 0)];
  return (
    <>
      <rect width={layout.widthPx} height={layout.heightPx} fill={ink.sheet} />
      {zones.map(({ x, y, width, height, level }) => {
        const corner = at(x, y + height);
        return (
          <rect
            key={`${x} ${y}`}
            {...corner}
            width={width * size.lengthM * layout.pxPerM}
            height={height * size.widthM * layout.pxPerM}
            fill={ink.together}
            opacity={levelOpacity[level]}
            shapeRendering="crispEdges"
          />
        );
      })}
      <path
        d={[
          ...nonesAlongLength.map((part) => `M${at(part, 0).x} ${topLeft.y}V${bottomRight.y}`),
          ...nonesAlongWidth.map((part) => `M${topLeft.x} ${at(0, part).y}H${bottomRight.x}`),
        ].join('')}
        stroke={ink.ink}
        strokeWidth="1.4"
        strokeDasharray="5 4"
      />
    </>
  );
}

/** "strong" and "none" above the plan and, where the mode changes that way too, beside it. */
function EdgeWords({ mode, layout }: { mode: RoomMode; layout: PlanLayout }) {
  const [alongLength, alongWidth] = mode.order;
  const crowded = alongLength > 4;
  return (
    <>
      {!crowded &&
        edgeWords(alongLength).map(({ at, strong }) => (
          <PictureText
            key={at}
            x={3 + at * (layout.widthPx - 6)}
            y={-7}
            textAnchor={at === 0 ? 'start' : at === 1 ? 'end' : 'middle'}
            bold={!strong}
            fill={strong ? ink.muted : ink.ink}
          >
            {strong ? 'strong' : 'none'}
          </PictureText>
        ))}
      {alongWidth <= 4 &&
        edgeWords(alongWidth).map(({ at, strong }) => (
          <PictureText
            key={at}
            x={-7}
            y={layout.heightPx - 3 - at * (layout.heightPx - 6) + (at === 0 ? 0 : at === 1 ? 10 : 5)}
            textAnchor="end"
            bold={!strong}
            fill={strong ? ink.muted : ink.ink}
          >
            {strong ? 'strong' : 'none'}
          </PictureText>
        ))}
    </>
  );
}

function describe({ name, kit }: RoomResponse, mode: RoomMode, plan: TreatmentPlan): string {
  const { nonesAlongLength, nonesAlongWidth } = modeZones(mode.order);
  const parts = (ways: number[], from: string) =>
    ways.length > 0
      ? `at ${ways.map((part) => `${number(part * 100, 0)} %`).join(', ')} of the way from the ${from}`
      : '';
  const none = [parts(nonesAlongLength, 'left'), parts(nonesAlongWidth, 'front')]
    .filter(Boolean)
    .join(' and ');
  return [
    `${name} from above, to scale${kit ? ', with the kit' : ''}.`,
    none
      ? `${number(mode.frequencyHz, 1)} Hz is strong at the walls; there is none ${none}.`
      : `${number(mode.frequencyHz, 1)} Hz is the same everywhere on the plan.`,
    spotOnPlanWords(plan),
  ].join(' ');
}
