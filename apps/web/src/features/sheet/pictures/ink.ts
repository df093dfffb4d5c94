/** The theme's colours as CSS variables, for SVG attributes; they follow light and dark by themselves. */
export const ink = {
  ink: 'var(--chakra-colors-ink)',
  muted: 'var(--chakra-colors-ink-muted)',
  rule: 'var(--chakra-colors-rule)',
  edge: 'var(--chakra-colors-edge)',
  sheet: 'var(--chakra-colors-sheet)',
  kick: 'var(--chakra-colors-kick)',
  overhead: 'var(--chakra-colors-overhead)',
  fix: 'var(--chakra-colors-fix)',
  watch: 'var(--chakra-colors-watch)',
  target: 'var(--chakra-colors-target)',
  together: 'var(--chakra-colors-together)',
  hatch: 'var(--chakra-colors-hatch)',
} as const;

/** Without colours the two microphones are told apart by the width of their lines. */
export const lineOnPaper = { kick: '3px', overhead: '1.1px' };
