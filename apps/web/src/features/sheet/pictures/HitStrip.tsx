import { Box } from '@chakra-ui/react';
import type { ReportResponse, Target } from '@thudline/contracts';
import { useId, useMemo } from 'react';
import { useWidth } from '../../../lib/useWidth';
import { axisStartDbfs, isClippedHit, ticksDbfs, type StripHit } from './hitStripLayout';
import { HitStripAxis } from './HitStripAxis';
import { HitStripRow } from './HitStripRow';

const heightPx = 180;
const rowsPx = { kick: 62, overhead: 128 };

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
    <Box ref={ref} position="relative" height={`${heightPx}px`} marginTop="14px" overflow="hidden">
      <svg
        width={widthPx}
        height={heightPx}
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
          y={rowsPx[role]}
          hits={strips[role]}
          track={report[role]}
          chosenHit={chosenHit}
          {...{ widthPx, x, target: report.target, onChoose }}
        />
      ))}
    </Box>
  );
}

export interface StripScale {
  (dbfs: number): number;
  left: number;
  right: number;
}

function stripScale(widthPx: number, startDbfs: number): StripScale {
  const left = widthPx < 480 ? 66 : 96;
  const right = widthPx - 34;
  const scale = (dbfs: number) =>
    left + ((Math.max(dbfs, startDbfs) - startDbfs) / -startDbfs) * (right - left);
  return Object.assign(scale, { left, right });
}

/** The kick line shows kick hits; the overhead's line every hit, since all of them share its preamp. */
function stripHits(report: ReportResponse): { kick: StripHit[]; overhead: StripHit[] } {
  const withLevel = (peakDbfs: number | null, index: number, role: 'kick' | 'overhead') =>
    peakDbfs === null
      ? []
      : [{ index, peakDbfs, clipped: isClippedHit(peakDbfs, report[role].level === 'clipped') }];
  return {
    kick: report.hits.flatMap((hit, i) =>
      hit.kind === 'kick' ? withLevel(hit.kickPeakDbfs, i, 'kick') : [],
    ),
    overhead: report.hits.flatMap((hit, i) => withLevel(hit.overheadPeakDbfs, i, 'overhead')),
  };
}

function describe({ kick, overhead, target }: ReportResponse & { target: Target }): string {
  const one = (name: string, track: typeof kick) =>
    track.loudestHitDbfs === null
      ? `${name}: no hit found`
      : `${name}: hardest hit ${track.loudestHitDbfs.toFixed(1)} dBFS, ${track.level ?? 'level not judged'}`;
  return `${one('Kick', kick)}. ${one('Overhead', overhead)}. The target is ${target.lowDbfs} to ${target.highDbfs} dBFS.`;
}
