import { Box, Flex } from '@chakra-ui/react';
import { StatusMark } from '../../../components/StatusMark';
import { TextLink } from '../../../components/TextLink';
import { useSameFiles } from '../hooks/useSameFiles';
import type { ReadyFile } from '../pickedFile';
import { sameFilesWords } from '../sameFilesWords';

/** Says which files were sent before. They may be sent again. */
export function SentBefore({ files }: { files: readonly ReadyFile[] }) {
  const sentences = sameFilesWords(useSameFiles(files));
  return (
    <div role="status">
      {sentences.map(({ takeId, count, strong, rest }) => (
        <Flex key={takeId} gap="11px" marginTop="12px" fontSize="16px" lineHeight="22px">
          <StatusMark status="watch" sizePx={21} />
          <Box minWidth={0} overflowWrap="anywhere">
            <b>{strong}</b> {rest} {/* In a window of its own, so that what was dropped here stays. */}
            <TextLink to={`/takes/${takeId}`} target="_blank">
              Look at it
            </TextLink>
            , or send {count === 1 ? 'it' : 'them'} again as another take.
          </Box>
        </Flex>
      ))}
    </div>
  );
}
