import { Box, Flex } from '@chakra-ui/react';
import { useState, type FormEvent } from 'react';
import { Button } from '../../../components/Button';
import { FieldError } from '../../../components/FieldError';
import { TextArea } from '../../../components/TextArea';
import { useFocusedBox } from '../hooks/useFocusedBox';
import { useNotesBench } from '../notesBench';

/** Tells whoever runs the installation what is wrong with a note, or with the sheet. */
export function ReportForm({ noteId, onDone }: { noteId?: string; onDone?: () => void }) {
  const { actions, setWriting } = useNotesBench();
  const leave = onDone ?? (() => setWriting(null));
  const form = useFocusedBox(true);
  const [reason, setReason] = useState('');
  const [failure, setFailure] = useState('');
  const [sent, setSent] = useState(false);
  const submit = async (event: FormEvent) => {
    event.preventDefault();
    setFailure('');
    try {
      await actions.complain({ noteId, reason });
      setSent(true);
    } catch (error) {
      setFailure(error instanceof Error ? error.message : 'It could not be sent. Try again.');
    }
  };
  if (sent)
    return (
      <Box role="status" fontSize="caption" marginTop="6px">
        Thank you. Whoever runs this site looks at it.
      </Box>
    );
  return (
    <Box as="form" ref={form} onSubmit={(event: FormEvent) => void submit(event)} marginTop="6px">
      <TextArea
        label={noteId ? 'What is wrong with this note?' : 'What is wrong with this sheet?'}
        value={reason}
        onChange={setReason}
        maxLength={500}
        required
      />
      {failure && <FieldError>{failure}</FieldError>}
      <Flex gap="10px" marginTop="10px" wrap="wrap">
        <Button type="submit">Report it</Button>
        <Button type="button" look="plain" onClick={leave}>
          Leave it
        </Button>
      </Flex>
    </Box>
  );
}
