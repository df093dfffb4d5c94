import { chakra } from '@chakra-ui/react';
import type { TakeListItem, Target } from '@thudline/contracts';
import { clippedPercent, isBelowAxis, levelPercent } from '../pictureScale';
import { levelsInWords } from '../rowWords';

const Picture = chakra('svg', {
  base: { position: 'absolute', inset: 0, width: '100%', height: '100%', overflow: 'visible' },
});

/** The target running down the table, and the line at 0 dBFS where a file clips. */
export function LevelBand({ target }: { target: Target }) {
  const low = levelPercent(target.lowDbfs);
  const high = levelPercent(target.highDbfs);
  const zero = `${levelPercent(0)}%`;
  return (
    <>
      <chakra.rect
        x={`${low}%`}
        y="0"
        width={`${high - low}%`}
        height="100%"
        fill="together"
        opacity={0.55}
      />
      {[low, high].map((percent) => (
        <chakra.line
          key={percent}
          x1={`${percent}%`}
          x2={`${percent}%`}
          y1="0"
          y2="100%"
          stroke="edge"
          strokeWidth="1.25"
        />
      ))}
      <chakra.line x1={zero} x2={zero} y1="0" y2="100%" stroke="fix" strokeWidth="1.5" opacity={0.65} />
    </>
  );
}

/** Hardest hit of each microphone: a disc for the kick, a ring for the overhead, a cross where it clipped. */
export function LevelPicture({ take, target }: { take: TakeListItem; target: Target }) {
  return (
    <Picture role="img" aria-label={levelsInWords(take, target)}>
      <LevelBand target={target} />
      <chakra.line
        x1={`${levelPercent(-24)}%`}
        x2={`${levelPercent(0)}%`}
        y1="50%"
        y2="50%"
        stroke="rule"
        strokeWidth="1"
      />
      <KickMark peakDbfs={take.kickPeakDbfs} clipped={take.kickClipped} />
      <OverheadMark peakDbfs={take.overheadPeakDbfs} clipped={take.overheadClipped} />
    </Picture>
  );
}

interface Mark {
  peakDbfs: number | null;
  clipped: boolean;
}

function KickMark({ peakDbfs, clipped }: Mark) {
  if (clipped) return <Cross color="kick" offsetPx={-6.5} />;
  if (peakDbfs === null) return null;
  if (isBelowAxis(peakDbfs)) return <Below color="kick" fill="kick" offsetPx={-6.5} />;
  return (
    <g transform="translate(0 -6.5)">
      <chakra.circle cx={`${levelPercent(peakDbfs)}%`} cy="50%" r="5.5" fill="kick" />
    </g>
  );
}

function OverheadMark({ peakDbfs, clipped }: Mark) {
  if (clipped) return <Cross color="overhead" offsetPx={6.5} />;
  if (peakDbfs === null) return null;
  if (isBelowAxis(peakDbfs)) return <Below color="overhead" fill="sheet" offsetPx={6.5} />;
  return (
    <g transform="translate(0 6.5)">
      <chakra.circle
        cx={`${levelPercent(peakDbfs)}%`}
        cy="50%"
        r="4.8"
        fill="sheet"
        stroke="overhead"
        strokeWidth="2.2"
      />
    </g>
  );
}

/** Points off the axis: this hit lies still lower. */
function Below({ color, fill, offsetPx }: { color: string; fill: string; offsetPx: number }) {
  return (
    <svg x={`${levelPercent(-24)}%`} y="50%" overflow="visible">
      <g transform={`translate(0 ${offsetPx})`}>
        <chakra.path d="M-6 0 4-4.6V4.6Z" fill={fill} stroke={color} strokeWidth="2" strokeLinejoin="round" />
      </g>
    </svg>
  );
}

function Cross({ color, offsetPx }: { color: string; offsetPx: number }) {
  return (
    <svg x={`${clippedPercent}%`} y="50%" overflow="visible">
      <g transform={`translate(0 ${offsetPx})`}>
        <chakra.path d="M-5-5 5 5M-5 5 5-5" stroke={color} strokeWidth="2.6" strokeLinecap="round" />
      </g>
    </svg>
  );
}

export { Picture as RowPicture };
