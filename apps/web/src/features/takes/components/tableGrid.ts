/**
 * The columns of the takes table. On a wide page: take, what it says, hardest hit, low end, what can be done. On a
 * narrow one each row stacks: take, sentence, then the two pictures side by side.
 */
export const rowGrid = {
  display: 'grid',
  gridTemplateColumns: {
    base: 'minmax(0, 3.2fr) minmax(0, 1fr) 52px',
    lg: 'minmax(140px, 1fr) minmax(190px, 1.4fr) 190px 112px 64px',
    xl: '270px minmax(0, 1fr) 226px 128px 72px',
  },
  gridTemplateAreas: {
    base: '"take take action" "says says says" "level low low"',
    lg: '"take says level low action"',
  },
} as const;

/** A row that has something to say instead of pictures. */
export const wideRowGrid = {
  ...rowGrid,
  gridTemplateAreas: {
    base: '"take take action" "says says says"',
    lg: '"take says says says action"',
  },
} as const;

/** 48 px with its rule, as in every ruled table. */
export const rowMinHeight = { base: 'auto', lg: '48px' } as const;
