import { useReport } from '../../sheet/hooks/useReport';
import { everyTake } from '../../takes/takesQuery';
import { useTakesFitting } from '../../takes/hooks/useTakes';

/** As many takes as the list gives at once. */
const countedTakes = 100;

/** The newest takes to count by, and the newest sheet among them to look at. */
export function useLatestTakes() {
  const { page, error, retry } = useTakesFitting(everyTake, countedTakes);
  const latest = page?.items.find((take) => take.summary !== null);
  const { report } = useReport(latest?.id ?? '', latest !== undefined);
  return { page, error, retry, latest, report };
}
