import { chakra } from '@chakra-ui/react';
import { useMemo } from 'react';
import { scanCode } from '../scanCode';

/** A code to scan: dark on light in both themes, since many cameras read no other. */
export function ScanCode({ text, label }: { text: string; label: string }) {
  const { sizeModules, path } = useMemo(() => scanCode(text), [text]);
  return (
    <chakra.svg
      role="img"
      aria-label={label}
      viewBox={`0 0 ${sizeModules} ${sizeModules}`}
      width="min(280px, 100%)"
      height="auto"
      marginX="auto"
      shapeRendering="crispEdges"
    >
      <rect width={sizeModules} height={sizeModules} fill="#FFFFFF" />
      <path d={path} fill="#1A1D21" />
    </chakra.svg>
  );
}
