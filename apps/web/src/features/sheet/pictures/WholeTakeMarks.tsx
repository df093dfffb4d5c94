import { chakra } from '@chakra-ui/react';
import type { ReportResponse } from '@thudline/contracts';
import { clock, plural } from '../../../lib/format';
import { ink } from './ink';
import { halo, PictureText } from './PictureText';
import { ticksMs } from './traceView';

const topPx = 16;

interface MarksProps {
  report: ReportResponse;
  chosenHit: number | null;
  widthPx: number;
  outlinePx: number;
}

/** What stands on the outlines: a tick for each kick hit, crosses where it clipped, the chosen hit, the time below. */
export function WholeTakeMarks({ report, chosenHit, widthPx, outlinePx }: MarksProps) {
  const { durationS, hits } = report;
  const x = (timeS: number) => (timeS / Math.max(durationS, 1e-3)) * widthPx;
  const bottom = topPx + 2 * outlinePx;
  const chosen = chosenHit === null ? undefined : hits[chosenHit];
  return (
    <chakra.svg
      position="absolute"
      left="0"
      top="0"
      width={`${widthPx}px`}
      height={`${bottom + 24}px`}
      pointerEvents="none"
      role="img"
      aria-label={describe(report)}
    >
      {hits.map(
        (hit, i) =>
          hit.kind === 'kick' && (
            <path key={i} d={`M${x(hit.timeS)} ${topPx - 6}v6`} stroke={ink.kick} strokeWidth="1.6" />
          ),
      )}
      {chosen && <path d={`M${x(chosen.timeS) - 4.5} 1h9l-4.5 7z`} fill={ink.ink} />}
      {(['kick', 'overhead'] as const).map((role, i) => (
        <g key={role}>
          {report[role].clipping.runs.map((run) => (
            <ClipCross
              key={run.startSample}
              x={x(run.startSample / report.sampleRateHz)}
              y={topPx + i * outlinePx + 6}
            />
          ))}
          <PictureText x={2} y={topPx + (i + 1) * outlinePx - 5} bold fill={ink[role]} {...halo}>
            {role}
          </PictureText>
        </g>
      ))}
      <path d={`M0 ${bottom + 1}H${widthPx}`} stroke={ink.edge} strokeWidth="1" />
      {ticksMs({ fromMs: 0, toMs: durationS }, widthPx < 480 ? 4 : 8).map((timeS) => (
        <PictureText key={timeS} x={x(timeS)} y={bottom + 17} textAnchor="middle" fill={ink.muted}>
          {clock(timeS)}
        </PictureText>
      ))}
    </chakra.svg>
  );
}

function ClipCross({ x, y }: { x: number; y: number }) {
  return <path d={`M${x - 4} ${y - 4}l8 8m0-8l-8 8`} stroke={ink.fix} strokeWidth="2.2" />;
}

function describe({ durationS, hits, kick, overhead }: ReportResponse): string {
  const clipped = kick.clipping.runCount + overhead.clipping.runCount;
  const kicks = hits.filter((hit) => hit.kind === 'kick').length;
  return `Outlines of kick and overhead over ${clock(durationS)}: ${plural(kicks, 'kick hit')}, ${
    clipped === 0 ? 'nothing clipped' : `clipped in ${plural(clipped, 'place')}`
  }.`;
}
