import { Box, Flex, chakra } from '@chakra-ui/react';
import type { CreatedShareResponse, ShareSubject } from '@thudline/contracts';
import { useState, type FormEvent } from 'react';
import { Button, TextButton } from '../../../components/Button';
import { CheckBox } from '../../../components/CheckBox';
import { FieldError } from '../../../components/FieldError';
import { TextArea } from '../../../components/TextArea';
import { useShareActions } from '../hooks/useShareActions';
import { exampleQuestion } from '../shareWords';
import { OpenFor } from './OpenFor';

const maxQuestionLength = 300;

/** What to ask, how long the link opens, and what may be done with it. */
export function ShareForm({
  subject,
  onCreated,
}: {
  subject: ShareSubject;
  onCreated: (share: CreatedShareResponse) => void;
}) {
  const { create } = useShareActions(subject);
  const [question, setQuestion] = useState('');
  const [expiresInDays, setExpiresInDays] = useState<number | null>(7);
  const [canListen, setCanListen] = useState(true);
  const [canDownload, setCanDownload] = useState(false);
  const [busy, setBusy] = useState(false);
  const [failure, setFailure] = useState('');
  const send = async (event: FormEvent) => {
    event.preventDefault();
    setBusy(true);
    setFailure('');
    try {
      onCreated(await create({ question, expiresInDays, canListen, canDownload }));
    } catch (error) {
      setFailure(error instanceof Error ? error.message : 'The link could not be made. Try again.');
      setBusy(false);
    }
  };
  return (
    <chakra.form onSubmit={(event) => void send(event)} marginTop="14px">
      <TextArea
        label="Your question, if you have one"
        value={question}
        onChange={setQuestion}
        maxLength={maxQuestionLength}
      />
      <Box fontSize="caption" color="ink.muted" marginTop="5px">
        It stands above the line. For example:{' '}
        <TextButton type="button" onClick={() => setQuestion(exampleQuestion)}>
          {exampleQuestion}
        </TextButton>
      </Box>
      <OpenFor days={expiresInDays} onChange={setExpiresInDays} />
      <Flex direction="column" gap="10px" marginTop="16px">
        <CheckBox checked={canListen} onChange={setCanListen}>
          They may listen
        </CheckBox>
        <CheckBox checked={canDownload} onChange={setCanDownload}>
          They may download the files
        </CheckBox>
      </Flex>
      {failure && <FieldError>{failure}</FieldError>}
      <Flex marginTop="20px" gap="16px" alignItems="center" wrap="wrap">
        <Button type="submit" disabled={busy}>
          {busy ? 'Making the link…' : 'Make the link'}
        </Button>
        <Box fontSize="caption" color="ink.muted">
          No account needed. It opens this sheet and nothing else.
        </Box>
      </Flex>
    </chakra.form>
  );
}
