import { Navigate } from 'react-router-dom';
import { Button } from '../components/Button';
import { PageLoading } from '../components/PageLoading';
import { PageMessage } from '../components/PageMessage';
import { Landing } from '../features/landing/components/Landing';
import { useMe } from '../features/auth/hooks/useMe';

/** Someone signed in goes on to their takes; a guest reads what this is. */
export function HomePage() {
  const { me, error, retry } = useMe();
  if (me) return <Navigate to="/takes" replace />;
  if (me === null) return <Landing />;
  if (!error) return <PageLoading />;
  return (
    <PageMessage strong="This page could not be opened." rest={error.message}>
      <Button onClick={retry}>Try again</Button>
    </PageMessage>
  );
}
