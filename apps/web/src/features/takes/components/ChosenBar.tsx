import { Box, Flex, chakra } from '@chakra-ui/react';
import { useEffect, useRef, useState } from 'react';
import { Button } from '../../../components/Button';
import { FieldError } from '../../../components/FieldError';
import { takeNumbers, type ChosenTake } from '../chosenTakes';
import { TagForm } from './TagForm';

/** "2 chosen: takes 12 and 14", and what can be done to them. */
export function ChosenBar({
  chosen,
  knownTags,
  onDelete,
  onTag,
  onClear,
}: {
  chosen: readonly ChosenTake[];
  knownTags: readonly string[];
  onDelete: () => Promise<void>;
  onTag: (tags: string[]) => Promise<void>;
  onClear: () => void;
}) {
  const { tagging, setTagging, button } = useTagging();
  const { failure, busy, remove } = useDeleting(onDelete);
  const them = chosen.length === 1 ? 'it' : 'them';
  if (tagging)
    return (
      <Box flex="1 1 100%" bg="target" boxShadow="inset 4px 0 0 var(--chakra-colors-ink)">
        <TagForm
          label={`Tags for ${takeNumbers(chosen)}, with commas between`}
          initial={[]}
          knownTags={knownTags}
          saveLabel={`Tag ${them}`}
          onSave={(tags) => onTag(tags).then(() => setTagging(false))}
          onLeave={() => setTagging(false)}
        />
      </Box>
    );
  return (
    <Box>
      <Flex wrap="wrap" alignItems="center" columnGap="18px" rowGap="10px">
        <span role="status">
          <chakra.b>{chosen.length} chosen:</chakra.b> {takeNumbers(chosen)}
        </span>
        <Button look="outline" ref={button} onClick={() => setTagging(true)}>
          Tag {them}
        </Button>
        <Button look="outline" aria-disabled={busy} onClick={() => void remove()}>
          {busy ? 'Deleting…' : `Delete ${them}`}
        </Button>
        <Button look="plain" onClick={onClear}>
          Clear
        </Button>
      </Flex>
      {failure && <FieldError>{failure}</FieldError>}
    </Box>
  );
}

/** When the tags are written or left, the focus goes back to where it came from. */
function useTagging() {
  const [tagging, setTagging] = useState(false);
  const wasTagging = useRef(false);
  const button = useRef<HTMLButtonElement>(null);
  useEffect(() => {
    if (wasTagging.current && !tagging) button.current?.focus();
    wasTagging.current = tagging;
  }, [tagging]);
  return { tagging, setTagging, button };
}

function useDeleting(onDelete: () => Promise<void>) {
  const [failure, setFailure] = useState('');
  const [busy, setBusy] = useState(false);
  const remove = async () => {
    if (busy) return;
    setBusy(true);
    setFailure('');
    try {
      await onDelete();
    } catch (error) {
      setFailure(error instanceof Error ? error.message : 'Deleting did not work. Try again.');
    } finally {
      setBusy(false);
    }
  };
  return { failure, busy, remove };
}
