import { Box } from '@chakra-ui/react';
import { defaultUserSettings, type TakeResponse } from '@thudline/contracts';
import { useMemo, type ReactNode } from 'react';
import { Button } from '../../../components/Button';
import { PageLoading } from '../../../components/PageLoading';
import { PageMessage } from '../../../components/PageMessage';
import { useMe } from '../../auth/hooks/useMe';
import { LazySheetNotes } from '../../notes/lazySheetNotes';
import { MeasuredSheet } from '../../sheet/components/MeasuredSheet';
import { useReport } from '../../sheet/hooks/useReport';
import { useTake } from '../../sheet/hooks/useTake';

/** A sheet to read and hear: nothing on it writes, even for its owner. */
export function ReadOnlySheet({
  takeId,
  above,
  gone,
}: {
  takeId: string;
  above?: ReactNode;
  /** What stands instead for some errors; the others offer another try. */
  gone?: (error: Error) => ReactNode;
}) {
  const { me } = useMe();
  const { take, error: takeError, retry: retryTake } = useTake(takeId);
  const { report, error: reportError, retry: retryReport } = useReport(takeId, take?.hasReport ?? false);
  const readOnly = useMemo(() => take && withoutChange(take), [take]);
  const error = takeError ?? reportError;
  if (error) {
    const retry = takeError ? retryTake : retryReport;
    return gone?.(error) || <NoAnswer error={error} retry={retry} />;
  }
  if (!readOnly || (readOnly.hasReport && !report)) return <PageLoading />;
  if (!report) return <NotYet />;
  return (
    <MeasuredSheet
      take={readOnly}
      report={report}
      settings={me?.settings ?? defaultUserSettings}
      above={above}
      Notes={LazySheetNotes}
      moreButtons={readOnly.rights.listen && <PhoneSpeakers />}
    />
  );
}

const withoutChange = (take: TakeResponse): TakeResponse => ({
  ...take,
  rights: { ...take.rights, change: false },
  // What was sent is the newest sheet.
  sheetVersions: [],
});

/** Where listening starts on a phone. */
function PhoneSpeakers() {
  return (
    <Box
      display={{ base: 'block', lg: 'none' }}
      order={1}
      width="100%"
      marginTop="-4px"
      fontSize="caption"
      lineHeight="19px"
      color="ink.muted"
    >
      Phone speakers can’t play this low: listen on headphones, not too loud.
    </Box>
  );
}

function NotYet() {
  return (
    <PageMessage
      strong="This sheet isn’t ready yet."
      rest="The take is still being measured. The sheet appears here by itself."
    />
  );
}

function NoAnswer({ error, retry }: { error: Error; retry: () => void }) {
  return (
    <PageMessage strong="The sheet could not be opened." rest={error.message}>
      <Button onClick={retry}>Try again</Button>
    </PageMessage>
  );
}
