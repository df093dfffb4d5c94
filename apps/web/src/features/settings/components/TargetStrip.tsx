import { Box, chakra } from '@chakra-ui/react';
import type { ReportResponse, Target } from '@thudline/contracts';
import { useId, useMemo } from 'react';
import { useWidth } from '../../../lib/useWidth';
import { HitDots } from '../../sheet/pictures/HitDots';
import { axisY, HitStripAxis } from '../../sheet/pictures/HitStripAxis';
import {
  axisStartDbfs,
  stackDots,
  stripHeightPx,
  stripHits,
  stripRowsPx,
  stripScale,
  ticksDbfs,
  type StripHit,
} from '../../sheet/pictures/hitStripLayout';
import { gripLimits, type Grip } from '../targetGrips';
import { GripHandle } from './GripHandle';

const noHits: { kick: StripHit[]; overhead: StripHit[] } = { kick: [], overhead: [] };

const grips: { grip: Grip; label: string; yPx: number }[] = [
  { grip: 'lowDbfs', label: 'Lower end of the target', yPx: 12 },
  { grip: 'highDbfs', label: 'Upper end of the target', yPx: 12 },
  { grip: 'aimDbfs', label: 'Aim', yPx: axisY - 6 },
];

interface TargetStripProps {
  /** As it is being moved. */
  target: Target;
  /** As it is kept: the axis stays where it is while a grip is dragged. */
  saved: Target;
  /** The newest sheet, whose hits are shown; undefined while there is none to show. */
  report: ReportResponse | undefined;
  caption: string;
  onMove: (grip: Grip, dbfs: number) => void;
  onKeyMove: (grip: Grip, dbfs: number) => void;
  onLetGo: () => void;
}

/** The newest take's hits on the level axis, with the target and the aim to take hold of. */
export function TargetStrip({
  target,
  saved,
  report,
  caption,
  onMove,
  onKeyMove,
  onLetGo,
}: TargetStripProps) {
  const { ref, widthPx } = useWidth<HTMLDivElement>(828);
  const hatchId = useId();
  const hits = useMemo(() => (report ? stripHits(report) : noHits), [report]);
  const startDbfs = axisStartDbfs(
    [...hits.kick, ...hits.overhead].map((hit) => hit.peakDbfs),
    saved,
  );
  const x = stripScale(widthPx, startDbfs);
  const dbfsAt = (clientX: number) => x.dbfsAt(clientX - (ref.current?.getBoundingClientRect().left ?? 0));
  return (
    <Box ref={ref} position="relative" height={`${stripHeightPx}px`}>
      <chakra.svg width={`${widthPx}px`} height={`${stripHeightPx}px`} display="block" aria-hidden>
        <HitStripAxis
          {...{ widthPx, x, hatchId, target, caption }}
          ticks={ticksDbfs(startDbfs, widthPx)}
          grips
        />
        {report &&
          (['kick', 'overhead'] as const).map((role) => (
            <HitDots
              key={role}
              {...{ role, x }}
              y={stripRowsPx[role]}
              dots={stackDots(hits[role], x)}
              clipped={report[role].level === 'clipped'}
            />
          ))}
      </chakra.svg>
      {grips.map(({ grip, label, yPx }) => (
        <GripHandle
          key={grip}
          {...{ label, yPx, dbfsAt, onLetGo }}
          {...gripLimits(target, grip)}
          solid={grip === 'aimDbfs'}
          xPx={x(target[grip])}
          valueDbfs={target[grip]}
          onMove={(dbfs) => onMove(grip, dbfs)}
          onKeyMove={(dbfs) => onKeyMove(grip, dbfs)}
        />
      ))}
    </Box>
  );
}
