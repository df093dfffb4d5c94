import { chakra } from '@chakra-ui/react';
import { swellPath } from './swellPath';

/** The flat line with its swelling belly, stretched to the width of what it underlines. */
export function Swell({ depthPx = 5, linePx = 1.5 }: { depthPx?: number; linePx?: number }) {
  return (
    <chakra.svg
      aria-hidden
      position="absolute"
      left="-2px"
      right="-2px"
      top="100%"
      width="calc(100% + 4px)"
      height={`${depthPx + linePx}px`}
      viewBox={`0 0 100 ${depthPx + linePx}`}
      preserveAspectRatio="none"
      fill="currentColor"
    >
      <path d={swellPath({ widthPx: 100, depthPx, linePx, endPx: 80 })} />
    </chakra.svg>
  );
}
