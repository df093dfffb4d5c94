import { Box, Flex, chakra } from '@chakra-ui/react';
import { shareLimits, type CreatedShareResponse, type ShareSubject } from '@thudline/contracts';
import { Button, TextButton } from '../../../components/Button';
import { FieldError } from '../../../components/FieldError';
import { TextArea } from '../../../components/TextArea';
import { TextField } from '../../../components/TextField';
import { useShareForm } from '../hooks/useShareForm';
import { exampleQuestion } from '../shareWords';
import { subjectWords } from '../subjectWords';
import { OpenFor } from './OpenFor';
import { ShareRights } from './ShareRights';

const maxQuestionLength = 300;

interface ShareFormProps {
  subject: ShareSubject;
  onCreated: (share: CreatedShareResponse) => void;
}

/** Who it is for and what to ask, how long the link opens, and what may be done with it. */
export function ShareForm({ subject, onCreated }: ShareFormProps) {
  const { draft, change, busy, failure, send } = useShareForm(subject, onCreated);
  const isMailed = draft.mailTo.trim() !== '';
  return (
    <chakra.form onSubmit={send} marginTop="14px" noValidate>
      <TextField
        label="Who is it for? Only you see this"
        value={draft.label}
        onChange={(label) => change({ label })}
        maxLength={60}
        autoComplete="off"
      />
      <Box marginTop="16px">
        <TextArea
          label="Your question, if you have one"
          value={draft.question}
          onChange={(question) => change({ question })}
          maxLength={maxQuestionLength}
        />
      </Box>
      <Box fontSize="caption" color="ink.muted" marginTop="5px">
        It stands above the line. For example:{' '}
        <TextButton type="button" onClick={() => change({ question: exampleQuestion })}>
          {exampleQuestion}
        </TextButton>
      </Box>
      <OpenFor choice={draft.openFor} day={draft.day} onChange={change} />
      <ShareRights kind={subject.kind} draft={draft} onChange={change} />
      <Flex direction="column" gap="14px" marginTop="16px">
        <TextField
          label="A passphrase, if you want one"
          value={draft.passphrase}
          onChange={(passphrase) => change({ passphrase })}
          maxLength={shareLimits.passphrase.longest}
          hint="Tell it another way than the link."
          autoComplete="off"
          autoCapitalize="none"
          spellCheck={false}
        />
        <TextField
          label="Mail it to, or leave empty for a link to copy"
          type="email"
          inputMode="email"
          value={draft.mailTo}
          onChange={(mailTo) => change({ mailTo })}
          autoComplete="off"
        />
      </Flex>
      {failure && <FieldError>{failure}</FieldError>}
      <Flex marginTop="20px" gap="16px" alignItems="center" wrap="wrap">
        <Button type="submit" disabled={busy}>
          {busy ? 'Making the link…' : isMailed ? 'Mail the link' : 'Make the link'}
        </Button>
        <Box fontSize="caption" color="ink.muted">
          No account needed. {subjectWords[subject.kind].reading}
        </Box>
      </Flex>
    </chakra.form>
  );
}
