import { Box } from '@chakra-ui/react';
import type { MailChoice, MailChoiceResponse } from '@thudline/contracts';
import { useParams } from 'react-router-dom';
import { Button } from '../components/Button';
import { FieldError } from '../components/FieldError';
import { PageLoading } from '../components/PageLoading';
import { PageMessage } from '../components/PageMessage';
import { PageTitle } from '../components/PageTitle';
import { AuthSheet } from '../features/auth/components/AuthSheet';
import { useMailChoice } from '../features/settings/hooks/useMailChoice';

const about: Record<MailChoice, string> = {
  notes: 'about notes and answers',
  sent: 'about sheets that are sent to you',
  opened: 'about sheets of yours that were opened',
  digest: 'about your week',
};

const margin = [
  {
    title: 'And the others?',
    text: 'Only these stop. Mails that keep your account safe, such as a new password, always come.',
  },
];

/** The link at the foot of a mail: one button, no account needed. */
export function UnsubscribePage() {
  const { token = '' } = useParams();
  const { choice, error, retry, refusal, set } = useMailChoice(token);
  if (error)
    return (
      <PageMessage strong="This link could not be opened." rest={error.message}>
        <Button onClick={retry}>Try again</Button>
      </PageMessage>
    );
  if (!choice) return <PageLoading />;
  return (
    <AuthSheet {...headline(choice)} margin={margin}>
      <PageTitle>Mails</PageTitle>
      <Box role="status">
        <Button look={choice.wanted ? 'solid' : 'outline'} onClick={() => void set(!choice.wanted)}>
          {choice.wanted ? 'Stop these mails' : 'Send them again'}
        </Button>
      </Box>
      {refusal && <FieldError>{refusal}</FieldError>}
    </AuthSheet>
  );
}

const headline = ({ choice, wanted }: MailChoiceResponse) =>
  wanted
    ? { strong: 'No more mails?', rest: `You get mails ${about[choice]}.` }
    : { strong: 'Stopped.', rest: `You get no more mails ${about[choice]}.` };
