/**
 * The columns of the takes table. On a wide page: box to choose it, take, what it says, hardest hit, low end, what can
 * be done. On a narrow one each row stacks: take, sentence, then the two pictures side by side.
 */
export const rowGrid = {
  display: 'grid',
  gridTemplateColumns: {
    base: '38px minmax(0, 2.4fr) minmax(0, 1fr) 62px',
    lg: '40px minmax(140px, 1fr) minmax(190px, 1.4fr) 190px 112px 66px',
    xl: '48px 222px minmax(0, 1fr) 226px 128px 72px',
  },
  gridTemplateAreas: {
    base: '"box take take action" "box says says says" "level level low low"',
    lg: '"box take says level low action"',
  },
} as const;

/** A row that has something to say instead of pictures. */
export const wideRowGrid = {
  ...rowGrid,
  gridTemplateAreas: {
    base: '"box take take action" "box says says says"',
    lg: '"box take says says says action"',
  },
} as const;

/** 48 px with its rule, as in every ruled table. */
export const rowMinHeight = { base: 'auto', lg: '48px' } as const;
