import { meResponse, paths, type DeleteAccountRequest } from '@thudline/contracts';
import { useSWRConfig } from 'swr';
import { requestJson } from '../../../lib/apiClient';

/** Asks for the account to be deleted, or takes that back. */
export function useDeletion() {
  const { mutate } = useSWRConfig();
  const send = async (method: 'POST' | 'DELETE', body?: DeleteAccountRequest) => {
    const me = await requestJson(paths.deletion, meResponse, { method, body });
    await mutate(paths.me, me, { revalidate: false });
  };
  return { ask: (body: DeleteAccountRequest) => send('POST', body), stop: () => send('DELETE') };
}
