import { Box, Flex, chakra } from '@chakra-ui/react';
import type { NamedSetup } from '@thudline/contracts';
import { useEffect, useRef, useState } from 'react';
import { Button } from '../../../components/Button';
import { ButtonLink } from '../../../components/ButtonLink';
import { FieldError } from '../../../components/FieldError';
import { chosenPlaces } from '../chosenPlaces';
import { takeNumbers, type ChosenTake } from '../chosenTakes';
import { failureWords } from '../hooks/useUndo';
import { SetUpChosen } from './SetUpChosen';
import { TagForm } from './TagForm';

interface ChosenBarProps {
  chosen: readonly ChosenTake[];
  knownTags: readonly string[];
  onDelete: () => Promise<void>;
  /** Set where the chosen takes are deleted ones: then this is what can be done to them. */
  onRestore?: () => Promise<void>;
  onTag: (tags: string[]) => Promise<void>;
  onSetUp: (setup: NamedSetup) => Promise<void>;
  onClear: () => void;
}

/** "2 chosen: takes 12 and 14", and what can be done to them. */
export function ChosenBar(props: ChosenBarProps) {
  const { chosen, knownTags, onDelete, onRestore, onTag, onSetUp, onClear } = props;
  const { open, setOpen, button } = useOpenForm();
  const { failure, busy, run } = useOneAtATime();
  const them = chosen.length === 1 ? 'it' : 'them';
  if (open)
    return (
      <Box flex="1 1 100%" bg="target" boxShadow="inset 4px 0 0 var(--chakra-colors-ink)">
        <TagForm
          label={`Tags for ${takeNumbers(chosen)}, with commas between`}
          initial={[]}
          knownTags={knownTags}
          saveLabel={`Tag ${them}`}
          onSave={(tags) => onTag(tags).then(() => setOpen(false))}
          onLeave={() => setOpen(false)}
        />
      </Box>
    );
  return (
    <Box>
      <Flex wrap="wrap" alignItems="center" columnGap="18px" rowGap="10px">
        <span role="status">
          <chakra.b>{chosen.length} chosen:</chakra.b> {takeNumbers(chosen)}
        </span>
        {onRestore ? (
          <Button look="outline" aria-disabled={busy} onClick={() => void run(onRestore)}>
            {busy ? 'Restoring…' : `Restore ${them}`}
          </Button>
        ) : (
          <>
            <ChosenPlaces chosen={chosen} />
            <Button look="outline" ref={button} onClick={() => setOpen(true)}>
              Tag {them}
            </Button>
            <SetUpChosen onChoose={(setup) => void run(() => onSetUp(setup))} />
            <Button look="outline" aria-disabled={busy} onClick={() => void run(onDelete)}>
              {busy ? 'Deleting…' : `Delete ${them}`}
            </Button>
          </>
        )}
        <Button look="plain" onClick={onClear}>
          Clear
        </Button>
      </Flex>
      {failure && <FieldError>{failure}</FieldError>}
    </Box>
  );
}

function ChosenPlaces({ chosen }: { chosen: readonly ChosenTake[] }) {
  return chosenPlaces(chosen).map(({ words, to }) => (
    <ButtonLink key={words} look="outline" to={to}>
      {words}
    </ButtonLink>
  ));
}

/** When what the form asks for is kept or left, the focus goes back to where it came from. */
function useOpenForm() {
  const [open, setOpen] = useState(false);
  const wasOpen = useRef(false);
  const button = useRef<HTMLButtonElement>(null);
  useEffect(() => {
    if (wasOpen.current && !open) button.current?.focus();
    wasOpen.current = open;
  }, [open]);
  return { open, setOpen, button };
}

function useOneAtATime() {
  const [failure, setFailure] = useState('');
  const [busy, setBusy] = useState(false);
  const run = async (act: () => Promise<void>) => {
    if (busy) return;
    setBusy(true);
    setFailure('');
    try {
      await act();
    } catch (error) {
      setFailure(failureWords(error));
    } finally {
      setBusy(false);
    }
  };
  return { failure, busy, run };
}
