import { comparisonResponse, paths, type ComparisonResponse } from '@thudline/contracts';
import useSWR from 'swr';
import { errorToShow, requestJson } from '../../../lib/apiClient';

/** What changed from one take to the other. */
export function useComparison(beforeId: string, afterId: string) {
  const { data, error, mutate } = useSWR<ComparisonResponse, Error>(
    paths.comparison(beforeId, afterId),
    (path: string) => requestJson(path, comparisonResponse),
  );
  return { comparison: data, error: errorToShow(data, error), retry: () => void mutate() };
}
