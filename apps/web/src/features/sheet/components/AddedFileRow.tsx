import { Box, chakra } from '@chakra-ui/react';
import { paths, type AddedFileResponse } from '@thudline/contracts';
import { TextButton } from '../../../components/Button';
import { DownloadLink } from '../../../components/DownloadLink';
import { ProgressSwell } from '../../../components/ProgressSwell';
import { decibels } from '../../../lib/format';
import { addedChoiceWords, addedFileFacts } from '../addedFileWords';
import { isBeingMade } from '../hooks/useAddedFiles';
import type { useAddedListening } from '../hooks/useAddedListening';

interface AddedFileRowProps {
  takeId: string;
  file: AddedFileResponse;
  /** Null where the reader may not. */
  hear: ReturnType<typeof useAddedListening> | null;
  onTryAgain: (() => void) | null;
  onRemove: (() => void) | null;
}

/** One added file: being made, failed, or there to be heard and kept. */
export function AddedFileRow({ takeId, file, hear, onTryAgain, onRemove }: AddedFileRowProps) {
  const words = addedChoiceWords(file.choice);
  return (
    <chakra.li borderBottom="1px solid" borderColor="rule" paddingY="8px">
      {file.file ? (
        <>
          <DownloadLink href={paths.addedFileDownload(takeId, file.id)}>{file.file.name}</DownloadLink>:{' '}
          {addedFileFacts(file.file)}
        </>
      ) : (
        <>Kick and {words}.</>
      )}
      {isBeingMade(file) && (
        <Box marginTop="6px" maxWidth="320px">
          <ProgressSwell share={file.progress} label={`Making one file: ${words}`} />
          <Box color="ink.muted" marginTop="4px">
            {file.state === 'queued' ? 'Waiting for its turn.' : 'Adding the two.'} You can leave this page.
          </Box>
        </Box>
      )}
      {file.state === 'failed' && (
        <Box role="alert" color="fix">
          {file.reason}
        </Box>
      )}
      <Box display="flex" flexWrap="wrap" columnGap="16px" marginTop="2px">
        {file.file && hear && <Hear {...{ file, hear, words }} />}
        {file.state === 'failed' && onTryAgain && (
          <TextButton minHeight="32px" onClick={onTryAgain}>
            Try again
          </TextButton>
        )}
        {!isBeingMade(file) && onRemove && (
          <TextButton minHeight="32px" aria-label={`Remove ${file.file?.name ?? words}`} onClick={onRemove}>
            Remove
          </TextButton>
        )}
      </Box>
    </chakra.li>
  );
}

function Hear({
  file: { id, file },
  hear,
  words,
}: {
  file: AddedFileResponse;
  hear: NonNullable<AddedFileRowProps['hear']>;
  words: string;
}) {
  const plays = hear.playingId === id;
  const quieter = file && file.listenGainDb <= -0.05;
  return (
    <>
      <TextButton
        minHeight="32px"
        aria-pressed={plays}
        aria-label={plays ? `Stop: ${words}` : `Hear it: ${words}`}
        onClick={() => (plays ? hear.stop() : void hear.play(id))}
      >
        {plays ? 'Stop' : 'Hear it'}
      </TextButton>
      {quieter && (
        <Box color="ink.muted" alignSelf="center">
          heard {decibels(-file.listenGainDb)} quieter, as loud as the two as recorded
        </Box>
      )}
    </>
  );
}
