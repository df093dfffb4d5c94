import { Box } from '@chakra-ui/react';
import type { OpenedShareResponse } from '@thudline/contracts';

/** What the sender wants to know, above the line. */
export function GuestQuestion({ opened }: { opened: OpenedShareResponse }) {
  if (!opened.question) return null;
  return (
    <Box
      borderLeft="1px solid"
      borderColor="margin"
      paddingLeft="14px"
      marginBottom="18px"
      maxWidth="704px"
      overflowWrap="anywhere"
    >
      <Box fontSize="caption" color="ink.muted" lineHeight="20px">
        {opened.from} asks
      </Box>
      <Box fontSize="22px" lineHeight="28px" fontWeight={600}>
        {opened.question}
      </Box>
    </Box>
  );
}
