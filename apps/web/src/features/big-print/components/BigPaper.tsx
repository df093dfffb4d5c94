import { Box, Flex } from '@chakra-ui/react';
import type { ReactNode } from 'react';
import { HeaderLine } from '../../../components/HeaderLine';

/** A whole screen of paper: words from the top, what can be pressed at the bottom, nothing else. */
export function BigPaper({ children, foot }: { children: ReactNode; foot?: ReactNode }) {
  return (
    <Box as="main" bg="sheet" minHeight="100dvh" _print={{ minHeight: 0 }}>
      <HeaderLine />
      <Flex
        direction="column"
        minHeight="calc(100dvh - 2px)"
        maxWidth="888px"
        marginX="auto"
        padding="24px 24px 22px"
        gap="26px"
      >
        <Box flex="1" minWidth={0}>
          {children}
        </Box>
        {foot && (
          <Flex direction="column" gap="12px" textAlign="center">
            {foot}
          </Flex>
        )}
      </Flex>
    </Box>
  );
}
