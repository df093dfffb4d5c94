import { Box, chakra } from '@chakra-ui/react';
import { swellPath } from './swellPath';

const linePx = 2;
const depthPx = 8.5;
const path = swellPath({ widthPx: 100, depthPx, linePx });

/** How far something has come: the swell fills the line from the left. */
export function ProgressSwell({
  share,
  label,
  valueText,
}: {
  /** 0–1 */
  share: number;
  label: string;
  /** Said instead of the percentage. */
  valueText?: string;
}) {
  const percent = Math.min(1, Math.max(0, share)) * 100;
  return (
    <Box
      role="progressbar"
      aria-label={label}
      aria-valuemin={0}
      aria-valuemax={100}
      aria-valuenow={Math.round(percent)}
      aria-valuetext={valueText}
      position="relative"
      height={`${linePx + depthPx}px`}
    >
      <Box position="absolute" insetX="0" top="0" height={`${linePx}px`} bg="rule" />
      <chakra.svg
        aria-hidden
        position="absolute"
        left="0"
        top="0"
        height="100%"
        viewBox={`0 0 100 ${linePx + depthPx}`}
        preserveAspectRatio="none"
        fill="currentColor"
        color="ink"
        transition="width 0.3s linear"
        _motionReduce={{ transition: 'none' }}
        style={{ width: `${percent}%` }}
      >
        <path d={path} />
      </chakra.svg>
    </Box>
  );
}
