import { useSearchParams } from 'react-router-dom';
import { Button } from '../components/Button';
import { PageLoading } from '../components/PageLoading';
import { PageMessage } from '../components/PageMessage';
import { PageTitle } from '../components/PageTitle';
import { useMe } from '../features/auth/hooks/useMe';
import { NewTryOutSheet } from '../features/tryouts/components/NewTryOutSheet';
import { useTakesById } from '../features/tryouts/hooks/useTakesById';
import { useTryOutOnce } from '../features/tryouts/hooks/useTryOut';

/** Starts a try-out of files to come or of the takes named in the address, or sends more takes to one that is there. */
export function NewTryOutPage() {
  const [params] = useSearchParams();
  const { me } = useMe();
  const toId = params.get('to');
  const takeIds = (params.get('takes') ?? '').split(',').filter(Boolean);
  const { takes, error: takesError, retry: retryTakes } = useTakesById(takeIds);
  const { tryOut, error: tryOutError, retry: retryTryOut } = useTryOutOnce(toId);
  const error = takesError ?? tryOutError;
  if (error)
    return (
      <PageMessage
        strong={takesError ? 'These takes could not be read.' : 'The try-out could not be opened.'}
        rest={error.message}
      >
        <Button onClick={takesError ? retryTakes : retryTryOut}>Try again</Button>
      </PageMessage>
    );
  if (!takes || !me || (toId && !tryOut)) return <PageLoading />;
  return (
    <>
      <PageTitle>{toId ? 'More takes of a try-out' : 'Start a try-out'}</PageTitle>
      <NewTryOutSheet takes={takes} to={tryOut ?? null} me={me} />
    </>
  );
}
