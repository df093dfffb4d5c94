import { openedShareResponse, paths, type OpenedShareResponse } from '@thudline/contracts';
import useSWR from 'swr';
import { requestJson } from '../../../lib/apiClient';

/**
 * Exchanges the token of a link for the cookie that opens its sheet, once a visit: addresses of the API never carry
 * tokens. Asked again only by hand, since every exchange counts as an opening.
 */
export function useOpenShare(token: string) {
  const { data, error, mutate } = useSWR<OpenedShareResponse, Error>(
    [paths.openShare, token],
    ([path]: [string, string]) => requestJson(path, openedShareResponse, { method: 'POST', body: { token } }),
    { revalidateOnFocus: false, revalidateOnReconnect: false, revalidateIfStale: false },
  );
  return { opened: data, error, retry: () => void mutate() };
}
