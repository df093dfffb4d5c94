import {
  createdShareResponse,
  paths,
  type CreatedShareResponse,
  type CreateShareRequest,
  type ShareSubject,
} from '@thudline/contracts';
import { useSWRConfig } from 'swr';
import { requestJson, requestNothing } from '../../../lib/apiClient';

/** Making a link and ending one; both make the subject's list of links stale. */
export function useShareActions(subject: ShareSubject) {
  const { mutate } = useSWRConfig();
  const listKey = paths.sharesOf(subject);
  return {
    create: async (body: Omit<CreateShareRequest, 'subject'>): Promise<CreatedShareResponse> => {
      const created = await requestJson(paths.shares, createdShareResponse, {
        method: 'POST',
        body: { subject, ...body },
      });
      await mutate(listKey);
      return created;
    },
    end: async (shareId: string) => {
      await requestNothing(paths.share(shareId), { method: 'DELETE' });
      await mutate(listKey);
    },
  };
}
