import { Button } from '../components/Button';
import { PageMessage } from '../components/PageMessage';

/** A page that failed while drawing or loading. What was sent and saved before is untouched. */
export function ErrorPage() {
  return (
    <PageMessage strong="This page broke." rest="What you saved is safe. Loading it again usually helps.">
      <Button onClick={() => window.location.reload()}>Load it again</Button>
    </PageMessage>
  );
}
