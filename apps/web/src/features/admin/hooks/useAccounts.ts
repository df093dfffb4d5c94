import {
  accountResponse,
  listAccountsResponse,
  paths,
  type ListAccountsResponse,
  type UpdateAccountRequest,
} from '@thudline/contracts';
import useSWR, { useSWRConfig } from 'swr';
import useSWRInfinite from 'swr/infinite';
import { errorToShow, requestJson, requestNothing } from '../../../lib/apiClient';
import { auditKey } from './useAudit';

const isAccountsKey = (key: unknown) => typeof key === 'string' && key.includes(paths.adminAccounts);

/** The accounts that fit, page after page. */
export function useAccounts(find: string) {
  const { data, error, mutate, size, setSize, isValidating } = useSWRInfinite<ListAccountsResponse, Error>(
    (index, before: ListAccountsResponse | null) => {
      if (index > 0 && !before?.next) return null;
      const query = new URLSearchParams();
      if (find) query.set('find', find);
      if (before?.next) query.set('after', before.next);
      const text = query.toString();
      return text ? `${paths.adminAccounts}?${text}` : paths.adminAccounts;
    },
    (path: string) => requestJson(path, listAccountsResponse),
    { keepPreviousData: true, revalidateFirstPage: false },
  );
  const last = data?.at(-1);
  return {
    accounts: data?.flatMap(({ items }) => items),
    total: last?.total ?? 0,
    bytes: last?.bytes ?? 0,
    hasMore: last?.next != null,
    isLoadingMore: isValidating && data !== undefined && data.length < size,
    more: () => void setSize(size + 1),
    error: errorToShow(data, error),
    retry: () => void mutate(),
    readAgain: () => mutate(),
  };
}

/** How many there are and what they keep, whatever is looked for. */
export function useEveryAccount() {
  const { data } = useSWR<ListAccountsResponse, Error>(paths.adminAccounts, (path: string) =>
    requestJson(path, listAccountsResponse),
  );
  return data;
}

/** What an admin does to an account; the lists that show it are read anew. */
export function useAccountActions(readAgain: () => Promise<unknown>) {
  const { mutate } = useSWRConfig();
  const after = async () => {
    await readAgain();
    // A list of pages is found by its own key only.
    await Promise.all([mutate(isAccountsKey), mutate(auditKey)]);
  };
  return {
    change: async (userId: string, body: UpdateAccountRequest) => {
      await requestJson(paths.adminAccount(userId), accountResponse, { method: 'PATCH', body });
      await after();
    },
    verify: (userId: string) => requestNothing(paths.adminVerification(userId), { method: 'POST' }),
  };
}
