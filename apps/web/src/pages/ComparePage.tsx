import { useParams } from 'react-router-dom';
import { Button } from '../components/Button';
import { ButtonLink } from '../components/ButtonLink';
import { PageLoading } from '../components/PageLoading';
import { PageMessage } from '../components/PageMessage';
import { useMe } from '../features/auth/hooks/useMe';
import { ComparedTakes } from '../features/compare/components/ComparedTakes';
import { useComparison } from '../features/compare/hooks/useComparison';
import { SendThis } from '../features/shares/components/SendThis';
import { useReport } from '../features/sheet/hooks/useReport';
import { ApiError } from '../lib/apiClient';
import { usePageTitle } from '../lib/usePageTitle';

/** Two takes side by side. */
export function ComparePage() {
  const { beforeId = '', afterId = '' } = useParams();
  const { me } = useMe();
  const { comparison, error, retry } = useComparison(beforeId, afterId);
  const before = useReport(beforeId, comparison !== undefined);
  const after = useReport(afterId, comparison !== undefined);
  usePageTitle(
    comparison ? `Take ${comparison.before.number} with take ${comparison.after.number}` : 'Compare',
  );
  const failed = [
    { error, retry },
    { error: before.error, retry: before.retry },
    { error: after.error, retry: after.retry },
  ].find((each) => each.error);
  if (failed?.error) return <CompareError error={failed.error} retry={failed.retry} />;
  if (!comparison || !before.report || !after.report || !me) return <PageLoading />;
  return (
    <ComparedTakes
      key={`${beforeId} ${afterId}`}
      {...{ comparison, before: before.report, after: after.report }}
      settings={me.settings}
      marginHead={
        !me.readOnly && <SendThis subject={{ kind: 'comparison', takeId: beforeId, otherTakeId: afterId }} />
      }
    />
  );
}

function CompareError({ error, retry }: { error: Error; retry: () => void }) {
  const code = error instanceof ApiError ? error.code : undefined;
  if (code === 'not-found')
    return (
      <PageMessage
        strong="There are no such two takes here."
        rest="One of them may have been deleted, or belongs to somebody else."
      >
        <ButtonLink to="/takes">Go to your takes</ButtonLink>
      </PageMessage>
    );
  if (code === 'not-measured-yet')
    return (
      <PageMessage strong="One of the takes is not measured yet." rest="They can be compared once both are.">
        <Button onClick={retry}>Look again</Button>
        <ButtonLink to="/takes" look="outline">
          Go to your takes
        </ButtonLink>
      </PageMessage>
    );
  return (
    <PageMessage strong="The comparison could not be opened." rest={error.message}>
      <Button onClick={retry}>Try again</Button>
    </PageMessage>
  );
}
