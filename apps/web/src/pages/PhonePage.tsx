import { useParams } from 'react-router-dom';
import { Button } from '../components/Button';
import { ButtonLink } from '../components/ButtonLink';
import { PageLoading } from '../components/PageLoading';
import { PageMessage } from '../components/PageMessage';
import { PhoneArrival } from '../features/big-print/components/PhoneArrival';
import { isUsedUp, useOpenPhoneLink } from '../features/big-print/hooks/useOpenPhoneLink';
import { usePageTitle } from '../lib/usePageTitle';

/** Where a scanned code leads: the phone is let in to read along, then shows the newest take. */
export function PhonePage() {
  const { token = '' } = useParams();
  usePageTitle('Big print');
  const { isIn, error, retry } = useOpenPhoneLink(token);
  if (isIn) return <PhoneArrival />;
  if (!error) return <PageLoading />;
  if (!isUsedUp(error))
    return (
      <PageMessage strong="This code could not be used." rest={error.message}>
        <Button onClick={retry}>Try again</Button>
      </PageMessage>
    );
  return (
    <PageMessage
      strong="This code doesn’t work any more."
      rest="Each works once, for a few minutes. Make a new one on the computer: “Show on my phone”."
    >
      <ButtonLink to="/sign-in" look="outline">
        Sign in on this phone
      </ButtonLink>
    </PageMessage>
  );
}
