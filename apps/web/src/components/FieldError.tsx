import { Box, Flex } from '@chakra-ui/react';
import type { ReactNode } from 'react';
import { StatusMark } from './StatusMark';

/** What is wrong and what to do, with the hooked arrow; stands beside the thing it speaks of. */
export function FieldError({ id, children }: { id?: string; children: ReactNode }) {
  return (
    <Flex id={id} role="alert" gap="11px" marginTop="9px" fontSize="16px" lineHeight="22px">
      <Box marginTop="-1px">
        <StatusMark status="fix" sizePx={21} />
      </Box>
      <Box minWidth={0} overflowWrap="anywhere">
        {children}
      </Box>
    </Flex>
  );
}
