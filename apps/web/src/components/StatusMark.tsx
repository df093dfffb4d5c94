import { chakra } from '@chakra-ui/react';
import type { FindingStatus } from '@thudline/contracts';

/** Pen marks, never coloured lights; the word always stands beside them. */
const marks: Record<FindingStatus, { path: string; color: string }> = {
  good: { path: 'M2 11.5 7.5 17 18.5 3.5', color: 'ink' },
  watch: { path: 'M1.5 12C3.5 6.5 6 6 8 9.5S12.5 13.5 14.5 9.5 17.5 7 19 9.5', color: 'watch' },
  fix: { path: 'M2.5 17C3 10.5 7.5 7.5 16.5 7.8M11.5 2.8 17 7.8 12 13', color: 'fix' },
  'cannot-tell': {
    path: 'M5.5 6.5C5.5 3.5 7.5 2 10 2S14.5 3.6 14.5 6.2C14.5 9.5 10 9.6 10 13.2M10 17.3V18',
    color: 'ink.muted',
  },
};

export const statusColor = (status: FindingStatus) => (status === 'good' ? 'ink' : marks[status].color);

export function StatusMark({ status, sizePx = 22 }: { status: FindingStatus; sizePx?: number }) {
  const { path, color } = marks[status];
  return (
    <chakra.svg
      aria-hidden
      width={`${sizePx}px`}
      height={`${sizePx}px`}
      viewBox="0 0 20 20"
      fill="none"
      stroke="currentColor"
      strokeWidth="2.4"
      strokeLinecap="round"
      strokeLinejoin="round"
      color={color}
      flexShrink={0}
    >
      <path d={path} />
    </chakra.svg>
  );
}
