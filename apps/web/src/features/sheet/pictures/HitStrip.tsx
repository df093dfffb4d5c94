import { Box } from '@chakra-ui/react';
import type { ReportResponse, Target } from '@thudline/contracts';
import { useId, useMemo } from 'react';
import { useWidth } from '../../../lib/useWidth';
import {
  axisStartDbfs,
  stripHeightPx,
  stripHits,
  stripRowsPx,
  stripScale,
  ticksDbfs,
} from './hitStripLayout';
import { HitStripAxis } from './HitStripAxis';
import { HitStripRow } from './HitStripRow';

/** A dot per hit on a dBFS axis, with the target, the aim and the edge where it clips. */
export function HitStrip({
  report,
  chosenHit,
  onChoose,
}: {
  report: ReportResponse;
  chosenHit: number | null;
  onChoose: (hitIndex: number) => void;
}) {
  const { ref, widthPx } = useWidth<HTMLDivElement>();
  const hatchId = useId();
  const strips = useMemo(() => stripHits(report), [report]);
  const startDbfs = axisStartDbfs(
    [...strips.kick, ...strips.overhead].map((hit) => hit.peakDbfs),
    report.target,
  );
  const x = stripScale(widthPx, startDbfs);
  return (
    <Box ref={ref} position="relative" height={`${stripHeightPx}px`} marginTop="14px" overflow="hidden">
      <svg
        width={widthPx}
        height={stripHeightPx}
        role="img"
        aria-label={describe(report)}
        style={{ display: 'block' }}
      >
        <HitStripAxis
          {...{ widthPx, x, hatchId, target: report.target, ticks: ticksDbfs(startDbfs, widthPx) }}
        />
      </svg>
      {(['kick', 'overhead'] as const).map((role) => (
        <HitStripRow
          key={role}
          role={role}
          y={stripRowsPx[role]}
          hits={strips[role]}
          track={report[role]}
          quiet={report.findings.some(({ topic, status }) => topic === `${role}-level` && status === 'good')}
          chosenHit={chosenHit}
          {...{ widthPx, x, target: report.target, onChoose }}
        />
      ))}
    </Box>
  );
}

function describe({ kick, overhead, target }: ReportResponse & { target: Target }): string {
  const one = (name: string, track: typeof kick) =>
    track.loudestHitDbfs === null
      ? `${name}: no hit found`
      : `${name}: hardest hit ${track.loudestHitDbfs.toFixed(1)} dBFS, ${track.level ?? 'level not judged'}`;
  return `${one('Kick', kick)}. ${one('Overhead', overhead)}. The target is ${target.lowDbfs} to ${target.highDbfs} dBFS.`;
}
