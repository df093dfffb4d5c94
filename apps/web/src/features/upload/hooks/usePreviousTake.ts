import { useReport } from '../../sheet/hooks/useReport';
import { useTake } from '../../sheet/hooks/useTake';
import type { PreviousTake } from '../previousTake';

/** The take before; null where there is none, it isn't measured, or it can't be read: a new take then follows nothing. */
export function usePreviousTake(takeId: string | null): PreviousTake | null {
  const { take } = useTake(takeId);
  const { report } = useReport(takeId ?? '', take?.hasReport ?? false);
  return take && report ? { take, actions: report.actions } : null;
}
