import { listAuditResponse, paths, type ListAuditResponse } from '@thudline/contracts';
import useSWRInfinite from 'swr/infinite';
import { errorToShow, requestJson } from '../../../lib/apiClient';

/** What happened, newest first, page after page. */
export function useAudit() {
  const { data, error, mutate, size, setSize } = useSWRInfinite<ListAuditResponse, Error>(
    (index, before: ListAuditResponse | null) => {
      if (index === 0) return paths.adminAudit;
      return before?.next ? `${paths.adminAudit}?after=${before.next}` : null;
    },
    (path: string) => requestJson(path, listAuditResponse),
  );
  return {
    entries: data?.flatMap(({ items }) => items),
    hasMore: data?.at(-1)?.next != null,
    more: () => void setSize(size + 1),
    error: errorToShow(data, error),
    retry: () => void mutate(),
  };
}
