import type { OpenedShareResponse } from '@thudline/contracts';
import { lazy } from 'react';
import { useParams } from 'react-router-dom';
import { PageFrame } from '../components/PageFrame';
import { PageLoading } from '../components/PageLoading';
import { AskPassphrase } from '../features/shares/components/AskPassphrase';
import { GuestFailure } from '../features/shares/components/GuestFailure';
import { GuestQuestion } from '../features/shares/components/GuestQuestion';
import { isEnded, LinkEnded } from '../features/shares/components/LinkEnded';
import { ReadOnlySheet } from '../features/shares/components/ReadOnlySheet';
import { SentBy } from '../features/shares/components/SentBy';
import { useOpenShare } from '../features/shares/hooks/useOpenShare';
import { subjectWords } from '../features/shares/subjectWords';
import { ApiError } from '../lib/apiClient';
import { usePageTitle } from '../lib/usePageTitle';

/** Most links are to a sheet; its readers load nothing of the other pages. */
const SharedComparison = lazy(async () => ({
  default: (await import('../features/shares/components/SharedComparison')).SharedComparison,
}));
const SharedTryOut = lazy(async () => ({
  default: (await import('../features/shares/components/SharedTryOut')).SharedTryOut,
}));
const SharedRoom = lazy(async () => ({
  default: (await import('../features/shares/components/SharedRoom')).SharedRoom,
}));

/** What is behind a link, for whoever holds it. */
export function SharedPage() {
  const { token = '' } = useParams();
  const { opened, error, retry, openWith } = useOpenShare(token);
  const what = opened ? subjectWords[opened.subject.kind].thing : '';
  usePageTitle(opened ? `A ${what} from ${opened.from}` : 'A link');
  const asksPassphrase = error instanceof ApiError && error.code === 'passphrase-needed';
  return (
    <PageFrame corner={opened && <SentBy opened={opened} />}>
      {opened ? (
        <Opened opened={opened} />
      ) : !error ? (
        <PageLoading />
      ) : asksPassphrase ? (
        <AskPassphrase openWith={openWith} />
      ) : (
        <GuestFailure error={error} retry={retry} />
      )}
    </PageFrame>
  );
}

function Opened({ opened }: { opened: OpenedShareResponse }) {
  const { subject } = opened;
  switch (subject.kind) {
    case 'take':
      return (
        <ReadOnlySheet
          takeId={subject.takeId}
          above={<GuestQuestion opened={opened} />}
          gone={(cause) => isEnded(cause) && <LinkEnded />}
        />
      );
    case 'comparison':
      return <SharedComparison opened={opened} takeId={subject.takeId} otherTakeId={subject.otherTakeId} />;
    case 'try-out':
      return <SharedTryOut opened={opened} tryOutId={subject.tryOutId} />;
    case 'room':
      return <SharedRoom opened={opened} roomId={subject.roomId} />;
  }
}
