import { Box, chakra } from '@chakra-ui/react';
import { TextButton } from '../../../components/Button';
import { DropBox } from '../../upload/components/DropBox';
import { FileBeingRead, FileNotSent } from '../../upload/components/PickedFileRow';
import { limitWords } from '../../upload/uploadWords';
import type { DraftAction, TryOutDraft } from '../upload/tryOutDraft';

/** Files that are still looked at or can't be used, and the way to more. */
export function DraftFiles({
  draft,
  dispatch,
  onChoose,
}: {
  draft: TryOutDraft;
  dispatch: (action: DraftAction) => void;
  onChoose: () => void;
}) {
  const loose = draft.files.filter(({ reading }) => reading.kind !== 'ready');
  return (
    <>
      {loose.length > 0 && (
        <chakra.ul aria-label="Files not in a pair" listStyleType="none" marginTop="14px">
          {loose.map((picked) =>
            picked.reading.kind === 'refused' ? (
              <FileNotSent
                key={picked.id}
                picked={picked}
                strong="Not sent:"
                message={picked.reading.message}
                onClear={() => dispatch({ type: 'removed', fileId: picked.id })}
              />
            ) : (
              <FileBeingRead key={picked.id} file={picked.file} />
            ),
          )}
        </chakra.ul>
      )}
      {draft.files.length === 0 && draft.takeIds.length === 0 ? (
        <Box marginTop="20px">
          <DropBox onChoose={onChoose} minHeight="200px" />
        </Box>
      ) : (
        <Box marginTop="10px" fontSize="caption" lineHeight="20px" color="ink.muted">
          Drop more WAV files anywhere on this page, or{' '}
          <TextButton type="button" color="ink" onClick={onChoose}>
            choose files
          </TextButton>
          . Up to {limitWords} each.
        </Box>
      )}
    </>
  );
}
