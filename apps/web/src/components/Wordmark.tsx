import { Box, chakra } from '@chakra-ui/react';
import { swellPath } from './swellPath';

/** The name over a line that swells under "thud" and thins out. */
export function Wordmark() {
  return (
    <Box as="span" display="inline-block" width="112px" lineHeight="30px">
      <Box as="span" display="block" fontWeight={900} fontSize="27px" letterSpacing="0.05px">
        thudline
      </Box>
      <chakra.svg
        aria-hidden
        display="block"
        width="112px"
        height="9px"
        viewBox="0 0 112 9"
        fill="currentColor"
        marginTop="0"
      >
        <path d={swellPath({ widthPx: 112, depthPx: 6.5, linePx: 2, endPx: 100 })} />
      </chakra.svg>
    </Box>
  );
}
