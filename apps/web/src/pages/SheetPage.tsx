import { useParams } from 'react-router-dom';
import { Button } from '../components/Button';
import { ButtonLink } from '../components/ButtonLink';
import { PageLoading } from '../components/PageLoading';
import { PageMessage } from '../components/PageMessage';
import { useMe } from '../features/auth/hooks/useMe';
import { BigPrintButton } from '../features/big-print/components/BigPrintButton';
import { BigPrintLinks } from '../features/big-print/components/BigPrintLinks';
import { comparePath } from '../features/compare/takeWords';
import { LazySheetNotes } from '../features/notes/lazySheetNotes';
import { RoomOfTake } from '../features/rooms/components/RoomOfTake';
import { SetupOfTake } from '../features/setups/components/SetupOfTake';
import { SendThis } from '../features/shares/components/SendThis';
import { MeasuredSheet } from '../features/sheet/components/MeasuredSheet';
import { MeasuringSheet } from '../features/sheet/components/MeasuringSheet';
import { OlderVersion } from '../features/sheet/components/OlderVersion';
import { useReport } from '../features/sheet/hooks/useReport';
import { useSheetVersion } from '../features/sheet/hooks/useSheetVersion';
import { useTake } from '../features/sheet/hooks/useTake';
import { ApiError } from '../lib/apiClient';
import { usePageTitle } from '../lib/usePageTitle';

/** One take's sheet: being measured, not measured, or read. */
export function SheetPage() {
  const { takeId = '' } = useParams();
  const { me } = useMe();
  const { take, error: takeError, retry: retryTake } = useTake(takeId);
  const { version } = useSheetVersion(take);
  const hasReport = take?.hasReport ?? false;
  const { report, error: reportError, retry: retryReport } = useReport(takeId, hasReport, version);
  usePageTitle(take ? `Take ${take.number}${take.title && `, ${take.title}`}` : 'Sheet');
  const error = takeError ?? reportError;
  if (error) return <SheetError error={error} retry={takeError ? retryTake : retryReport} />;
  if (!take || !me || (take.hasReport && !report)) return <PageLoading />;
  return report ? (
    <MeasuredSheet
      key={take.id}
      {...{ take, report }}
      settings={me.settings}
      Notes={LazySheetNotes}
      above={<OlderVersion {...{ take, report }} />}
      marginHead={
        <>
          {take.rights.change && <SendThis subject={{ kind: 'take', takeId: take.id }} />}
          <SetupOfTake take={take} />
          <RoomOfTake take={take} />
          <BigPrintLinks takeId={take.id} mayAddPhone={take.rights.change} />
        </>
      }
      moreButtons={
        <>
          <BigPrintButton takeId={take.id} />
          {take.follows && (
            <ButtonLink look="outline" to={comparePath(take.follows.id, take.id)}>
              Compare with take {take.follows.number}
            </ButtonLink>
          )}
        </>
      }
    />
  ) : (
    <MeasuringSheet take={take} />
  );
}

function SheetError({ error, retry }: { error: Error; retry: () => void }) {
  if (error instanceof ApiError && error.code === 'not-found')
    return (
      <PageMessage
        strong="There is no such sheet here."
        rest="It may have been deleted, or it belongs to somebody else."
      >
        <ButtonLink to="/takes">Go to your takes</ButtonLink>
      </PageMessage>
    );
  return (
    <PageMessage strong="The sheet could not be opened." rest={error.message}>
      <Button onClick={retry}>Try again</Button>
    </PageMessage>
  );
}
