import type { ReportResponse, TakeListItem, TakeResponse } from '@thudline/contracts';
import { useNextTake } from '../hooks/useNextTake';
import { useWakeLock } from '../hooks/useWakeLock';
import { BigMeasuring } from './BigMeasuring';
import { BigPrint } from './BigPrint';

/** One take's Big print, going on to the next take by itself. */
export function BigPrintOf({
  take,
  report,
  newest,
  newestMeasured,
}: {
  take: TakeResponse;
  report: ReportResponse | undefined;
  newest: TakeListItem | null;
  newestMeasured: TakeListItem | null;
}) {
  const next = useNextTake(take, { newest, newestMeasured });
  useWakeLock();
  return report ? <BigPrint take={take} report={report} next={next} /> : <BigMeasuring take={take} />;
}
