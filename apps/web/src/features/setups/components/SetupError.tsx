import { Button } from '../../../components/Button';
import { ButtonLink } from '../../../components/ButtonLink';
import { PageMessage } from '../../../components/PageMessage';
import { ApiError } from '../../../lib/apiClient';

/** A setup that is not there, or could not be read. */
export function SetupError({ error, onRetry }: { error: Error; onRetry: () => void }) {
  if (error instanceof ApiError && error.code === 'not-found')
    return (
      <PageMessage
        strong="There is no such setup here."
        rest="It may have been removed, or it belongs to somebody else."
      >
        <ButtonLink to="/setups">Go to your setups</ButtonLink>
      </PageMessage>
    );
  return (
    <PageMessage strong="The setup could not be opened." rest={error.message}>
      <Button onClick={onRetry}>Try again</Button>
    </PageMessage>
  );
}
