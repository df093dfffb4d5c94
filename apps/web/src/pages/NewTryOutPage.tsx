import { useSearchParams } from 'react-router-dom';
import { Button } from '../components/Button';
import { PageLoading } from '../components/PageLoading';
import { PageMessage } from '../components/PageMessage';
import { PageTitle } from '../components/PageTitle';
import { useMe } from '../features/auth/hooks/useMe';
import { NewTryOutSheet } from '../features/tryouts/components/NewTryOutSheet';
import { useTakesById } from '../features/tryouts/hooks/useTakesById';

/** Starts a try-out: of files to come, or of the takes named in the address. */
export function NewTryOutPage() {
  const [params] = useSearchParams();
  const { me } = useMe();
  const takeIds = (params.get('takes') ?? '').split(',').filter(Boolean);
  const { takes, error, retry } = useTakesById(takeIds);
  if (error)
    return (
      <PageMessage strong="These takes could not be read." rest={error.message}>
        <Button onClick={retry}>Try again</Button>
      </PageMessage>
    );
  if (!takes || !me) return <PageLoading />;
  return (
    <>
      <PageTitle>Start a try-out</PageTitle>
      <NewTryOutSheet takes={takes} me={me} />
    </>
  );
}
