import { Box, Flex } from '@chakra-ui/react';
import type { TakeResponse } from '@thudline/contracts';
import { useState, type FormEvent } from 'react';
import { Button } from '../../../components/Button';
import { TextArea } from '../../../components/TextArea';
import { TextField } from '../../../components/TextField';
import { useTakeEdits } from '../hooks/useTakeEdits';

/** Title and note of a take, to write on. */
export function TakeNoteForm({ take, onDone }: { take: TakeResponse; onDone: () => void }) {
  const { update } = useTakeEdits(take);
  const [title, setTitle] = useState(take.title);
  const [note, setNote] = useState(take.note);
  const [failure, setFailure] = useState('');
  const save = async (event: FormEvent) => {
    event.preventDefault();
    setFailure('');
    try {
      await update({ title, note });
      onDone();
    } catch (error) {
      setFailure(error instanceof Error ? error.message : 'This could not be saved. Try again.');
    }
  };
  return (
    <Box as="form" onSubmit={(event) => void save(event)} paddingLeft={{ base: 0, lg: '20px' }}>
      <TextField
        label="Title"
        value={title}
        onChange={setTitle}
        maxLength={120}
        ref={(input: HTMLInputElement | null) => input?.focus()}
      />
      <TextArea label="Note" value={note} onChange={setNote} maxLength={4000} />
      {failure && (
        <Box role="alert" color="fix" fontSize="small" marginTop="8px">
          {failure}
        </Box>
      )}
      <Flex gap="12px" marginTop="12px">
        <Button type="submit">Save</Button>
        <Button type="button" look="plain" onClick={onDone}>
          Leave it
        </Button>
      </Flex>
    </Box>
  );
}
