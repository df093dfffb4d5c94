import { Box, Flex, chakra } from '@chakra-ui/react';
import { updateTakeRequest } from '@thudline/contracts';
import { useEffect, useRef, useState } from 'react';
import { Button, TextButton } from '../../../components/Button';
import { TextField } from '../../../components/TextField';
import { typedTags } from '../chosenTakes';

/** Writes tags with commas between; those in use can be put in with a click. */
export function TagForm({
  label,
  initial,
  knownTags,
  saveLabel,
  onSave,
  onLeave,
}: {
  label: string;
  initial: readonly string[];
  knownTags: readonly string[];
  saveLabel: string;
  onSave: (tags: string[]) => Promise<void>;
  onLeave: () => void;
}) {
  const [text, setText] = useState(initial.join(', '));
  const field = useRef<HTMLInputElement>(null);
  useEffect(() => field.current?.focus(), []);
  const { failure, busy, save } = useSavedTags(onSave);
  const tags = typedTags(text);
  return (
    <chakra.form
      noValidate
      width="100%"
      paddingX="16px"
      paddingTop="10px"
      paddingBottom="14px"
      onKeyDown={(event) => event.key === 'Escape' && !busy && onLeave()}
      onSubmit={(event) => {
        event.preventDefault();
        void save(tags);
      }}
    >
      <Flex alignItems="flex-end" wrap="wrap" columnGap="18px" rowGap="12px">
        <Box flex="1 1 260px" maxWidth="520px">
          <TextField
            label={label}
            value={text}
            onChange={setText}
            ref={field}
            placeholder="rug, blankets"
            autoComplete="off"
            error={failure}
          />
        </Box>
        <Flex gap="10px">
          <Button type="submit" aria-disabled={busy}>
            {busy ? 'Keeping…' : saveLabel}
          </Button>
          <Button type="button" look="plain" disabled={busy} onClick={onLeave}>
            Leave it
          </Button>
        </Flex>
      </Flex>
      <KnownTags
        tags={knownTags.filter((tag) => !tags.includes(tag))}
        onAdd={(tag) => setText([...tags, tag].join(', '))}
      />
    </chakra.form>
  );
}

function KnownTags({ tags, onAdd }: { tags: readonly string[]; onAdd: (tag: string) => void }) {
  if (tags.length === 0) return null;
  return (
    <Flex wrap="wrap" columnGap="14px" marginTop="8px" fontSize="small" color="ink.muted">
      In use:
      {tags.map((tag) => (
        <TextButton key={tag} type="button" minHeight="26px" color="ink" onClick={() => onAdd(tag)}>
          {tag}
        </TextButton>
      ))}
    </Flex>
  );
}

/** Checked by the contract before anything is sent; a refusal stands under the field. */
function useSavedTags(onSave: (tags: string[]) => Promise<void>) {
  const [failure, setFailure] = useState('');
  const [busy, setBusy] = useState(false);
  const save = async (tags: string[]) => {
    if (busy) return;
    const parsed = updateTakeRequest.shape.tags.safeParse(tags);
    if (!parsed.success) return setFailure(parsed.error.issues[0]?.message ?? 'These are no tags.');
    setBusy(true);
    setFailure('');
    try {
      await onSave(parsed.data ?? []);
    } catch (error) {
      setFailure(error instanceof Error ? error.message : 'The tags could not be kept. Try again.');
    } finally {
      setBusy(false);
    }
  };
  return { failure, busy, save };
}
