import { Button } from '../components/Button';
import { ButtonLink } from '../components/ButtonLink';
import { PageLoading } from '../components/PageLoading';
import { PageMessage } from '../components/PageMessage';
import { useSampleSheet } from '../features/landing/hooks/useSampleSheet';
import { ReadOnlySheet } from '../features/shares/components/ReadOnlySheet';
import { usePageTitle } from '../lib/usePageTitle';

/** A sheet we made earlier, to read and hear with or without an account. */
export function SamplePage() {
  usePageTitle('A sheet we made earlier');
  const { takeId, error, retry } = useSampleSheet();
  if (takeId) return <ReadOnlySheet takeId={takeId} />;
  if (error)
    return (
      <PageMessage strong="The sheet could not be opened." rest={error.message}>
        <Button onClick={retry}>Try again</Button>
      </PageMessage>
    );
  if (takeId === undefined) return <PageLoading />;
  return (
    <PageMessage
      strong="There is no sheet to show here yet."
      rest="The check take says what to record for one."
    >
      <ButtonLink to="/check-take">Read the check take</ButtonLink>
    </PageMessage>
  );
}
