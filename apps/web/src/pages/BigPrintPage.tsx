import { useParams } from 'react-router-dom';
import { Button } from '../components/Button';
import { ButtonLink } from '../components/ButtonLink';
import { PageLoading } from '../components/PageLoading';
import { PageMessage } from '../components/PageMessage';
import { BigPrintOf } from '../features/big-print/components/BigPrintOf';
import { useNewestTake } from '../features/big-print/hooks/useNewestTake';
import { useReport } from '../features/sheet/hooks/useReport';
import { useTake } from '../features/sheet/hooks/useTake';
import { ApiError } from '../lib/apiClient';
import { usePageTitle } from '../lib/usePageTitle';

/** For a phone propped by the kit: what to do before the next take, very large. */
export function BigPrintPage() {
  const { takeId = '' } = useParams();
  const { take, error: takeError, retry: retryTake } = useTake(takeId);
  const { report, error: reportError, retry: retryReport } = useReport(takeId, take?.hasReport ?? false);
  const { newest, newestMeasured, error: listError } = useNewestTake();
  usePageTitle(take ? `Take ${take.number}, Big print` : 'Big print');
  const error = takeError ?? reportError;
  if (error) return <BigError error={error} retry={takeError ? retryTake : retryReport} />;
  const listKnown = newest !== undefined || listError !== undefined;
  if (!take || !listKnown || (take.hasReport && !report)) return <PageLoading />;
  return (
    <BigPrintOf
      key={take.id}
      {...{ take, report, newest: newest ?? null, newestMeasured: newestMeasured ?? null }}
    />
  );
}

function BigError({ error, retry }: { error: Error; retry: () => void }) {
  if (error instanceof ApiError && error.code === 'not-found')
    return (
      <PageMessage strong="There is no such take here." rest="It may have been deleted.">
        <ButtonLink to="/takes">Go to your takes</ButtonLink>
      </PageMessage>
    );
  return (
    <PageMessage strong="This take could not be opened." rest={error.message}>
      <Button onClick={retry}>Try again</Button>
    </PageMessage>
  );
}
