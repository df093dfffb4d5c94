import { useParams } from 'react-router-dom';
import { Button } from '../components/Button';
import { PageFrame } from '../components/PageFrame';
import { PageLoading } from '../components/PageLoading';
import { PageMessage } from '../components/PageMessage';
import { GuestQuestion } from '../features/shares/components/GuestQuestion';
import { isEnded, LinkEnded } from '../features/shares/components/LinkEnded';
import { ReadOnlySheet } from '../features/shares/components/ReadOnlySheet';
import { SentBy } from '../features/shares/components/SentBy';
import { useOpenShare } from '../features/shares/hooks/useOpenShare';
import { usePageTitle } from '../lib/usePageTitle';

/** The sheet behind a link, for whoever holds it. */
export function SharedSheetPage() {
  const { token = '' } = useParams();
  const { opened, error, retry } = useOpenShare(token);
  usePageTitle(opened ? `A sheet from ${opened.from}` : 'A sheet');
  return (
    <PageFrame corner={opened && <SentBy opened={opened} />}>
      {opened?.subject.kind === 'take' ? (
        <ReadOnlySheet
          takeId={opened.subject.takeId}
          above={<GuestQuestion opened={opened} />}
          gone={(cause) => isEnded(cause) && <LinkEnded />}
        />
      ) : !error && !opened ? (
        <PageLoading />
      ) : !error || isEnded(error) ? (
        <LinkEnded />
      ) : (
        <PageMessage strong="The sheet could not be opened." rest={error.message}>
          <Button onClick={retry}>Try again</Button>
        </PageMessage>
      )}
    </PageFrame>
  );
}
