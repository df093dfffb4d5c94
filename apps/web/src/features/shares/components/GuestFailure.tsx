import { Button } from '../../../components/Button';
import { PageMessage } from '../../../components/PageMessage';
import { isEnded } from '../isEnded';
import { LinkEnded } from './LinkEnded';

/** What stands where a page that was sent could not be read: it has ended meanwhile, or another try is worth it. */
export function GuestFailure({ error, retry }: { error: Error; retry: () => void }) {
  if (isEnded(error)) return <LinkEnded />;
  return (
    <PageMessage strong="This could not be opened." rest={error.message}>
      <Button onClick={retry}>Try again</Button>
    </PageMessage>
  );
}
