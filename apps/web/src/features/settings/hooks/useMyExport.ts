import { exportResponse, myExportResponse, paths, type MyExportResponse } from '@thudline/contracts';
import useSWR from 'swr';
import { errorToShow, requestJson } from '../../../lib/apiClient';
import { useRefusal } from './useRefusal';

/** Making one takes seconds to minutes, and somebody looks on. */
const lookAgainMs = 1_000;

const isBeingMade = ({ export: latest }: MyExportResponse) =>
  latest?.state === 'queued' || latest?.state === 'running';

/** The archive of everything, followed while it is made. */
export function useMyExport() {
  const { data, error, mutate } = useSWR<MyExportResponse, Error>(
    paths.export,
    () => requestJson(paths.export, myExportResponse),
    { refreshInterval: (latest) => (latest && isBeingMade(latest) ? lookAgainMs : 0) },
  );
  const { refusal, act } = useRefusal(mutate);
  return {
    mine: data,
    beingMade: data !== undefined && isBeingMade(data),
    error: errorToShow(data, error),
    retry: () => void mutate(),
    refusal,
    ask: () => act(() => requestJson(paths.export, exportResponse, { method: 'POST' })),
  };
}
