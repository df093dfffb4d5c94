import { paths, reportResponse, type ReportResponse } from '@thudline/contracts';
import useSWR from 'swr';
import { errorToShow, requestJson } from '../../../lib/apiClient';

/**
 * What was measured; asked for once the take has a report. Without a version it is the current one. When another version
 * is asked for, the one before stays until it is there.
 */
export function useReport(takeId: string, hasReport: boolean, version?: string) {
  const query = version ? `?${new URLSearchParams({ version }).toString()}` : '';
  const { data, error, mutate } = useSWR<ReportResponse, Error>(
    hasReport ? paths.report(takeId) + query : null,
    (path: string) => requestJson(path, reportResponse),
    { keepPreviousData: true },
  );
  const report = data?.takeId === takeId ? data : undefined;
  return { report, error: errorToShow(report, error), retry: () => void mutate() };
}
