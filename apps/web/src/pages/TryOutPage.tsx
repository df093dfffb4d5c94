import { useState } from 'react';
import { useParams } from 'react-router-dom';
import { Button } from '../components/Button';
import { ButtonLink } from '../components/ButtonLink';
import { PageLoading } from '../components/PageLoading';
import { PageMessage } from '../components/PageMessage';
import { useMe } from '../features/auth/hooks/useMe';
import { SendThis } from '../features/shares/components/SendThis';
import { TryOutSheet } from '../features/tryouts/components/TryOutSheet';
import { useTryOut } from '../features/tryouts/hooks/useTryOut';
import { defaultRank, useTryOutRanking } from '../features/tryouts/hooks/useTryOutRanking';
import { ApiError } from '../lib/apiClient';
import { usePageTitle } from '../lib/usePageTitle';

/** One try-out: being sent and measured, or ranked. */
export function TryOutPage() {
  const { tryOutId = '' } = useParams();
  const { me } = useMe();
  const [by, setBy] = useState(defaultRank);
  const { tryOut, error: tryOutError, retry: retryTryOut } = useTryOut(tryOutId);
  const { ranking, error: rankingError, retry: retryRanking } = useTryOutRanking(tryOut, by);
  usePageTitle('Try-out');
  const error = tryOutError ?? rankingError;
  if (error) return <TryOutError error={error} retry={tryOutError ? retryTryOut : retryRanking} />;
  if (!tryOut || !ranking || !me) return <PageLoading />;
  return (
    <TryOutSheet
      key={tryOut.id}
      {...{ tryOut, ranking, by, me }}
      marginHead={!me.readOnly && <SendThis subject={{ kind: 'try-out', tryOutId }} />}
      onRankBy={setBy}
    />
  );
}

function TryOutError({ error, retry }: { error: Error; retry: () => void }) {
  if (error instanceof ApiError && error.code === 'not-found')
    return (
      <PageMessage
        strong="There is no such try-out here."
        rest="It may have been deleted, or it belongs to somebody else."
      >
        <ButtonLink to="/tryouts">Go to your try-outs</ButtonLink>
      </PageMessage>
    );
  return (
    <PageMessage strong="The try-out could not be opened." rest={error.message}>
      <Button onClick={retry}>Try again</Button>
    </PageMessage>
  );
}
