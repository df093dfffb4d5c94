import {
  listComplaintsResponse,
  paths,
  type ComplaintResponse,
  type ListComplaintsResponse,
} from '@thudline/contracts';
import useSWR from 'swr';
import { errorToShow, requestJson, requestNothing } from '../../../lib/apiClient';
import { useRefusal } from '../../settings/hooks/useRefusal';

/** What people say is wrong with notes and sheets. */
export function useComplaints() {
  const { data, error, mutate } = useSWR<ListComplaintsResponse, Error>(paths.complaints, (path: string) =>
    requestJson(path, listComplaintsResponse),
  );
  const { refusal, act } = useRefusal(mutate);
  return {
    complaints: data?.items,
    error: errorToShow(data, error),
    retry: () => void mutate(),
    refusal,
    settle: ({ id }: ComplaintResponse, removeNote: boolean) =>
      act(() => requestNothing(paths.complaint(id), { method: 'PATCH', body: { removeNote } })),
  };
}
