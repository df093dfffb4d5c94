import { Navigate, Outlet, useLocation } from 'react-router-dom';
import { Button } from '../components/Button';
import { PageLoading } from '../components/PageLoading';
import { PageMessage } from '../components/PageMessage';
import { useMe } from '../features/auth/hooks/useMe';

/** Pages for someone signed in; others sign in first and come back to where they wanted to go. */
export function SignedIn() {
  const { me, error, retry } = useMe();
  const { pathname, search } = useLocation();
  if (me) return <Outlet />;
  if (error) return <NoAnswer message={error.message} retry={retry} />;
  if (me === undefined) return <PageLoading />;
  return <Navigate to="/sign-in" replace state={{ from: pathname + search }} />;
}

/** Join and sign in: someone signed in is taken on to where they wanted to go; who just joined, to the first take. */
export function GuestOnly() {
  const { me, error, retry } = useMe();
  const location = useLocation();
  const { pathname } = location;
  const state = location.state as { from?: string } | null;
  if (me) return <Navigate to={state?.from ?? (pathname === '/join' ? '/takes/new' : '/takes')} replace />;
  if (me === null) return <Outlet />;
  if (error) return <NoAnswer message={error.message} retry={retry} />;
  return <PageLoading />;
}

function NoAnswer({ message, retry }: { message: string; retry: () => void }) {
  return (
    <PageMessage strong="This page could not be opened." rest={message}>
      <Button onClick={retry}>Try again</Button>
    </PageMessage>
  );
}
