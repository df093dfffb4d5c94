import { Box, Flex } from '@chakra-ui/react';
import { Button } from '../../../components/Button';
import { limitWords } from '../uploadWords';

/** The place to drop files, drawn; the whole page takes them too. */
export function DropBox({ onChoose, minHeight = '236px' }: { onChoose: () => void; minHeight?: string }) {
  return (
    <Flex
      direction="column"
      alignItems="center"
      justifyContent="center"
      textAlign="center"
      minHeight={minHeight}
      padding="24px 16px 26px"
      border="2px dashed"
      borderColor="edge"
      borderRadius="3px"
    >
      <Button type="button" onClick={onChoose}>
        Choose files
      </Button>
      <Box marginTop="10px" lineHeight="26px" maxWidth="250px">
        two mono files, or one stereo file with a microphone on each side
      </Box>
      <Box marginTop="12px" fontSize="caption" color="ink.muted">
        WAV, up to {limitWords} each. Kept bit for bit, seen by nobody until you send it.
      </Box>
    </Flex>
  );
}
