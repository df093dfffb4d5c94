import { paths, reportResponse, type ReportResponse } from '@thudline/contracts';
import useSWR from 'swr';
import { errorToShow, requestJson } from '../../../lib/apiClient';

/** What was measured; asked for once the take has a report. */
export function useReport(takeId: string, hasReport: boolean) {
  const { data, error, mutate } = useSWR<ReportResponse, Error>(
    hasReport ? paths.report(takeId) : null,
    (path: string) => requestJson(path, reportResponse),
  );
  return { report: data, error: errorToShow(data, error), retry: () => void mutate() };
}
