import { Box } from '@chakra-ui/react';
import type { TakeResponse } from '@thudline/contracts';
import { Button, TextButton } from '../../../components/Button';
import { addedChoiceWords, isSameChoice } from '../addedFileWords';
import { useAddedFiles } from '../hooks/useAddedFiles';
import { useAddedListening } from '../hooks/useAddedListening';
import type { Bench } from '../hooks/useChoice';
import type { Listening } from '../hooks/useListening';
import { AddedFileRow } from './AddedFileRow';
import { PictureTitle } from './SheetSection';

export interface AddedFilesProps {
  take: Pick<TakeResponse, 'id' | 'rights'>;
  bench: Bench;
  listening: Listening;
}

/** The two microphones added into one file with the choice that stands on the sheet, and those made earlier. */
export function AddedFiles({ take, bench, listening }: AddedFilesProps) {
  const { files, error, retry, refusal, make, remove } = useAddedFiles(take.id);
  const heard = useAddedListening(take.id, listening);
  const { change, listen } = take.rights;
  if (files?.length === 0 && !change) return null;
  return (
    <Box as="section" aria-label="One file of the two" _print={{ display: 'none' }}>
      <PictureTitle>One file of the two</PictureTitle>
      {change && files && (
        <MakeOne
          words={addedChoiceWords(bench.chosen)}
          isThere={files.some(
            ({ choice, state }) => state !== 'failed' && isSameChoice(choice, bench.chosen),
          )}
          onMake={() => void make(bench.chosen)}
        />
      )}
      {(refusal ?? heard.failure) && (
        <Box role="alert" color="fix" fontSize="small" marginTop="6px">
          {refusal ?? heard.failure}
        </Box>
      )}
      {error && (
        <Box role="alert" fontSize="small" marginTop="6px">
          The files made of this take could not be listed. {error.message}{' '}
          <TextButton fontWeight={600} onClick={retry}>
            Try again
          </TextButton>
        </Box>
      )}
      {!files && !error && (
        <Box role="status" fontSize="small" color="ink.muted" marginTop="6px">
          Looking for files made earlier.
        </Box>
      )}
      {files && files.length > 0 && (
        <Box
          as="ul"
          listStyleType="none"
          marginTop="8px"
          fontSize="small"
          borderTop="1px solid"
          borderColor="rule"
        >
          {files.map((file) => (
            <AddedFileRow
              key={file.id}
              takeId={take.id}
              file={file}
              hear={listen ? heard : null}
              onTryAgain={change ? () => void make(file.choice) : null}
              onRemove={change ? () => void remove(file.id) : null}
            />
          ))}
        </Box>
      )}
    </Box>
  );
}

function MakeOne({ words, isThere, onMake }: { words: string; isThere: boolean; onMake: () => void }) {
  return (
    <Box display="flex" flexWrap="wrap" alignItems="center" columnGap="16px" rowGap="8px" marginTop="6px">
      <Button look="outline" disabled={isThere} onClick={onMake}>
        Make one file of the two
      </Button>
      <Box flex="1 1 240px" fontSize="small">
        {isThere ? 'This one is below: ' : 'Kick and '}
        {words}.
      </Box>
    </Box>
  );
}
