import type { OpenedShareResponse } from '@thudline/contracts';
import { lazy } from 'react';
import { useParams } from 'react-router-dom';
import { PageFrame } from '../components/PageFrame';
import { PageLoading } from '../components/PageLoading';
import { GuestQuestion } from '../features/shares/components/GuestQuestion';
import { isEnded } from '../features/shares/isEnded';
import { ReadOnlySheet } from '../features/shares/components/ReadOnlySheet';
import { SentBy } from '../features/shares/components/SentBy';
import { useOpenShare } from '../features/shares/hooks/useOpenShare';
import { subjectWords } from '../features/shares/subjectWords';
import { usePageTitle } from '../lib/usePageTitle';

/** Most links are to a sheet and open: its readers load nothing of what else there is. */
const SharedSeveral = lazy(async () => ({
  default: (await import('../features/shares/components/SharedSeveral')).SharedSeveral,
}));
const NotOpened = lazy(async () => ({
  default: (await import('../features/shares/components/NotOpened')).NotOpened,
}));

/** What is behind a link, for whoever holds it. */
export function SharedPage() {
  const { token = '' } = useParams();
  const { opened, error, retry, openWith } = useOpenShare(token);
  const what = opened ? subjectWords[opened.subject.kind].thing : '';
  usePageTitle(opened ? `A ${what} from ${opened.from}` : 'A link');
  return (
    <PageFrame corner={opened && <SentBy opened={opened} />}>
      {opened ? (
        <Opened opened={opened} retry={retry} openWith={openWith} />
      ) : error ? (
        <NotOpened {...{ error, retry, openWith }} />
      ) : (
        <PageLoading />
      )}
    </PageFrame>
  );
}

function Opened({
  opened,
  ...again
}: {
  opened: OpenedShareResponse;
  retry: () => void;
  openWith: (passphrase: string) => Promise<void>;
}) {
  const { subject } = opened;
  if (subject.kind !== 'take') return <SharedSeveral opened={opened} />;
  return (
    <ReadOnlySheet
      takeId={subject.takeId}
      above={<GuestQuestion opened={opened} />}
      gone={(error) => isEnded(error) && <NotOpened error={error} {...again} />}
    />
  );
}
