import { Box } from '@chakra-ui/react';
import type { ComparisonResponse } from '@thudline/contracts';
import { takeWords } from '../takeWords';

/** Which two takes these are, for somebody who has no others to choose from. */
export function SentHead({ before, after }: Pick<ComparisonResponse, 'before' | 'after'>) {
  return (
    <Box color="ink.muted" lineHeight="30px" overflowWrap="anywhere">
      {takeWords(before)}, then {takeWords(after)}
    </Box>
  );
}
