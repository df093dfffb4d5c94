import { Box, chakra } from '@chakra-ui/react';
import { swellPath } from './swellPath';

/** The line that heads every sheet: flat across its width, swelling once at the left. */
export function HeaderLine() {
  return (
    <Box position="relative" height="2px" bg="ink" aria-hidden>
      <chakra.svg
        position="absolute"
        top="0"
        left={{ base: '-18px', lg: '14px' }}
        width={{ base: '240px', lg: '430px' }}
        height="15px"
        viewBox="0 0 430 15"
        preserveAspectRatio="none"
        color="ink"
        fill="currentColor"
        zIndex={1}
      >
        <path d={swellPath({ widthPx: 430, depthPx: 11.5, linePx: 2, endPx: 420 })} />
      </chakra.svg>
    </Box>
  );
}
