import { chakra } from '@chakra-ui/react';

/** The line a page opens with: what to do is heavy (`<b>`), the reason light. */
export const Headline = chakra('h1', {
  base: {
    fontSize: { base: 'linePhone', lg: 'line' },
    lineHeight: { base: '33px', lg: '41px' },
    fontWeight: 400,
    letterSpacing: '-0.012em',
    textWrap: 'pretty',
    _print: { fontSize: 'line', lineHeight: '41px' },
    '& b': { fontWeight: 900 },
  },
});
