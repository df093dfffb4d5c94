import type { RoomSize } from '@thudline/dsp';
import type { PlanLayout } from '../../rooms/pictures/planLayout';
import { ink } from '../../sheet/pictures/ink';
import { halo, PictureText } from '../../sheet/pictures/PictureText';
import type { WallStretch } from './wallStretches';
import { wallLine, wavePath } from './wallLine';

/** What is planned is a bar, what is soft already a wave, a door a gap. */
export function OnWalls({
  look,
  stretches,
  layout,
  size,
}: {
  look: 'planned' | 'soft' | 'door';
  stretches: readonly WallStretch[];
  layout: PlanLayout;
  size: RoomSize;
}) {
  return stretches.map((stretch, i) => {
    const { from, to, inward } = wallLine(stretch, size, layout);
    const key = `${stretch.wall} ${i}`;
    if (look === 'soft')
      return <path key={key} d={wavePath(from, to, inward)} fill="none" stroke={ink.ink} strokeWidth="2" />;
    if (look === 'door')
      return (
        <g key={key}>
          <path d={`M${from.x} ${from.y}L${to.x} ${to.y}`} stroke={ink.sheet} strokeWidth="4" />
          <path
            d={`M${from.x} ${from.y}L${to.x} ${to.y}`}
            stroke={ink.ink}
            strokeWidth="1.4"
            strokeDasharray="3 3"
          />
          <PictureText
            x={(from.x + to.x) / 2 + inward.x * 10}
            y={(from.y + to.y) / 2 + 5 + inward.y * 14}
            textAnchor={inward.x > 0 ? 'start' : inward.x < 0 ? 'end' : 'middle'}
            fill={ink.muted}
            {...halo}
            strokeWidth={3}
          >
            door
          </PictureText>
        </g>
      );
    return (
      <rect
        key={key}
        x={Math.min(from.x, to.x, from.x + inward.x * 9)}
        y={Math.min(from.y, to.y, from.y + inward.y * 9)}
        width={Math.abs(to.x - from.x) || 9}
        height={Math.abs(to.y - from.y) || 9}
        fill={ink.sheet}
        stroke={ink.ink}
        strokeWidth="1.8"
      />
    );
  });
}
