import type { ReportResponse } from '@thudline/contracts';
import { useExcerpt } from './useExcerpt';

/** Long enough to hear a kick ring out, short enough for a quick repeat. */
const beforeS = 0.06;
const afterS = 0.94;

/** The samples around one of the report's hits; not asked for by those who may not listen. */
export function useHitExcerpt(report: ReportResponse, hitIndex: number, canListen = true) {
  const hitS = report.hits[hitIndex].timeS;
  const startS = Math.max(0, hitS - beforeS);
  const endS = Math.min(report.durationS, hitS + afterS);
  return useExcerpt(canListen ? report.takeId : null, { startS, durationS: endS - startS });
}
