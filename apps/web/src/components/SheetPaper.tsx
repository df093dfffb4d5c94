import { Box, chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';

/**
 * The ruled sheet: body and, from 62 rem up, a margin line with what is written beside it.
 * At 1280 px: 64 gutter, 704 body, 56 gap, 328 margin. Without `margin` the body has the whole width.
 */
export function SheetPaper({ children, margin }: { children: ReactNode; margin?: ReactNode }) {
  return (
    <Box
      bg="sheet"
      borderBottom="1px solid"
      borderColor="rule"
      minHeight={{ base: '60vh', lg: '520px' }}
      position="relative"
      display={{ base: 'block', lg: margin ? 'grid' : 'block' }}
      gridTemplateColumns="minmax(0, 1fr) 328px"
      _print={{ border: 'none', minHeight: 0 }}
    >
      <Box
        paddingLeft={{ base: '18px', md: '40px', lg: '64px' }}
        paddingRight={{ base: '18px', md: '40px', lg: margin ? '56px' : '64px' }}
        paddingTop={{ base: '22px', lg: '25px' }}
        paddingBottom="40px"
        minWidth={0}
        // Below the swell of the head.
        _print={{ padding: '16px 0 0' }}
      >
        {children}
      </Box>
      {margin && (
        <chakra.aside
          aria-label="In the margin"
          borderLeft={{ lg: '1px solid' }}
          borderColor={{ lg: 'margin' }}
          padding={{ base: '0 18px 32px', md: '0 40px 32px', lg: '24px 20px 32px' }}
          fontSize="small"
          position="relative"
          _print={{ border: 'none', padding: '12px 0 0' }}
        >
          {margin}
        </chakra.aside>
      )}
    </Box>
  );
}
