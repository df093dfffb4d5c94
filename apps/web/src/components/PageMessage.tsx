import { Box, Flex } from '@chakra-ui/react';
import type { ReactNode } from 'react';
import { Headline } from './Headline';
import { SheetPaper } from './SheetPaper';

/** A whole page that says one thing and offers the next step: errors, refusals, nothing here yet. */
export function PageMessage({
  strong,
  rest,
  children,
}: {
  strong: string;
  rest?: string;
  children?: ReactNode;
}) {
  return (
    <SheetPaper>
      <Box paddingTop={{ base: '24px', lg: '40px' }} maxWidth="704px" role="alert">
        <Headline>
          <b>{strong}</b> {rest}
        </Headline>
        {children && (
          <Flex marginTop="28px" gap="16px" alignItems="center" wrap="wrap">
            {children}
          </Flex>
        )}
      </Box>
    </SheetPaper>
  );
}
