import { paths, sampleSheetResponse, type SampleSheetResponse } from '@thudline/contracts';
import useSWR from 'swr';
import { requestJson } from '../../../lib/apiClient';

/** The sheet that anybody may read; `takeId` is null where there is none and undefined while asking. */
export function useSampleSheet() {
  const { data, error, mutate } = useSWR<SampleSheetResponse, Error>(paths.sampleSheet, (path: string) =>
    requestJson(path, sampleSheetResponse),
  );
  return { takeId: data?.takeId, error, retry: () => void mutate() };
}
