import { Box, chakra } from '@chakra-ui/react';
import type { ShareResponse } from '@thudline/contracts';
import { TextButton } from '../../../components/Button';
import { openedWords, rightsWords, whoHasItWords } from '../shareWords';

interface ShareRowProps {
  share: ShareResponse;
  now: Date;
  onEnd: () => void;
}

/** One open link: who has it, when it was opened, until when it opens, and the way to end it. */
export function ShareRow({ share, now, onEnd }: ShareRowProps) {
  return (
    <chakra.li marginTop="8px" overflowWrap="anywhere">
      {share.question && <Box color="ink">“{share.question}”</Box>}
      <Box>
        {whoHasItWords(share)} {openedWords(share, now)} {rightsWords(share)}{' '}
        <TextButton onClick={onEnd}>End this link</TextButton>
      </Box>
    </chakra.li>
  );
}
