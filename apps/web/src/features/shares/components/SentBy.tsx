import { Box } from '@chakra-ui/react';
import type { OpenedShareResponse } from '@thudline/contracts';
import { openUntilWords } from '../openUntilWords';

/** Stands where an owner would find their name: who sent the sheet, and until when it opens. */
export function SentBy({ opened }: { opened: OpenedShareResponse }) {
  return (
    <Box color="ink.muted" fontSize="caption" lineHeight="18px" textAlign="right">
      <Box truncate maxWidth={{ base: '190px', lg: '400px' }}>
        sent by {opened.from}
      </Box>
      {openUntilWords(opened)}
    </Box>
  );
}
