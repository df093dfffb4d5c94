import { defaultUserSettings, type OpenedShareResponse } from '@thudline/contracts';
import { LinksAsText } from '../../../components/LinksAsText';
import { PageLoading } from '../../../components/PageLoading';
import { PageMessage } from '../../../components/PageMessage';
import { ApiError } from '../../../lib/apiClient';
import { useMe } from '../../auth/hooks/useMe';
import { ComparedTakes } from '../../compare/components/ComparedTakes';
import { useComparison } from '../../compare/hooks/useComparison';
import { useReport } from '../../sheet/hooks/useReport';
import { GuestFailure } from './GuestFailure';
import { GuestQuestion } from './GuestQuestion';

interface SharedComparisonProps {
  opened: OpenedShareResponse;
  takeId: string;
  otherTakeId: string;
}

/** Two takes side by side, to read and hear. */
export function SharedComparison({ opened, takeId, otherTakeId }: SharedComparisonProps) {
  const { me } = useMe();
  const { comparison, error, retry } = useComparison(takeId, otherTakeId);
  const before = useReport(takeId, comparison !== undefined);
  const after = useReport(otherTakeId, comparison !== undefined);
  if (error instanceof ApiError && error.code === 'not-measured-yet')
    return <PageMessage strong="One of the takes is not measured yet." rest="Look again in a minute." />;
  const failed = error ? { error, retry } : before.error ? before : after.error ? after : null;
  if (failed?.error) return <GuestFailure error={failed.error} retry={failed.retry} />;
  if (!comparison || !before.report || !after.report) return <PageLoading />;
  return (
    <LinksAsText>
      <ComparedTakes
        {...{ comparison, before: before.report, after: after.report }}
        settings={me?.settings ?? defaultUserSettings}
        above={<GuestQuestion opened={opened} />}
        sent
      />
    </LinksAsText>
  );
}
