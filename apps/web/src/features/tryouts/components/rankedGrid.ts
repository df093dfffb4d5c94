/** Columns of the ranked takes, which line up into pictures; on a phone each take is a block of its own. */
export const rankedGrid = {
  display: 'grid',
  columnGap: { base: '10px', lg: '12px' },
  gridTemplateColumns: {
    base: '24px minmax(0, 1fr) auto 48px',
    lg: '28px minmax(0, 138px) 126px 76px minmax(0, 1fr) 92px 56px',
  },
  gridTemplateAreas: {
    base: '"rank place value winner" "rank words words winner" "rank cymbals cymbals winner"',
    lg: '"rank place picture value words cymbals winner"',
  },
} as const;

export const onDesk = { base: 'none', lg: 'block' } as const;
