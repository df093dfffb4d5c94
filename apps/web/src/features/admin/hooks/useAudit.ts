import { listAuditResponse, paths, type ListAuditResponse } from '@thudline/contracts';
import useSWRInfinite, { unstable_serialize } from 'swr/infinite';
import { errorToShow, requestJson } from '../../../lib/apiClient';

function auditPage(index: number, before: ListAuditResponse | null) {
  if (index === 0) return paths.adminAudit;
  return before?.next ? `${paths.adminAudit}?after=${before.next}` : null;
}

/** By this key whoever changes something lets what happened be read anew. */
export const auditKey = unstable_serialize(auditPage);

/** What happened, newest first, page after page. */
export function useAudit() {
  const { data, error, mutate, size, setSize } = useSWRInfinite<ListAuditResponse, Error>(
    auditPage,
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
