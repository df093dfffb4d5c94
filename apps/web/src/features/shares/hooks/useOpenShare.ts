import { openedShareResponse, paths, type OpenedShareResponse } from '@thudline/contracts';
import useSWR from 'swr';
import { requestJson } from '../../../lib/apiClient';

const exchange = (token: string, passphrase?: string) =>
  requestJson(paths.openShare, openedShareResponse, { method: 'POST', body: { token, passphrase } });

/**
 * Exchanges the token of a link for the cookie that opens what it names, once a visit: addresses of the API never carry
 * tokens. Asked again only by hand, since every exchange counts as an opening.
 */
export function useOpenShare(token: string) {
  const { data, error, mutate } = useSWR<OpenedShareResponse, Error>(
    [paths.openShare, token],
    () => exchange(token),
    {
      revalidateOnFocus: false,
      revalidateOnReconnect: false,
      revalidateIfStale: false,
      shouldRetryOnError: false,
    },
  );
  return {
    opened: data,
    error,
    retry: () => void mutate(),
    /** @throws what the server says of the passphrase */
    openWith: async (passphrase: string): Promise<void> => {
      await mutate(await exchange(token, passphrase), { revalidate: false });
    },
  };
}
