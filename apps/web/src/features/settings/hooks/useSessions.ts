import { listSessionsResponse, paths, type ListSessionsResponse } from '@thudline/contracts';
import useSWR from 'swr';
import { errorToShow, requestJson, requestNothing } from '../../../lib/apiClient';
import { useRefusal } from './useRefusal';

/** Where the player is signed in. */
export function useSessions() {
  const { data, error, mutate } = useSWR<ListSessionsResponse, Error>(paths.sessions, () =>
    requestJson(paths.sessions, listSessionsResponse),
  );
  const { refusal, act } = useRefusal(mutate);
  return {
    sessions: data?.items,
    error: errorToShow(data, error),
    retry: () => void mutate(),
    refusal,
    signOut: (sessionId: string) => act(() => requestNothing(paths.session(sessionId), { method: 'DELETE' })),
    signOutOthers: () => act(() => requestNothing(paths.sessions, { method: 'DELETE' })),
  };
}
