import { paths, takeResponse, type TakeResponse } from '@thudline/contracts';
import useSWR from 'swr';
import { requestJson } from '../../../lib/apiClient';

/** Several takes by their ids, in that order; those that are gone are left out. */
export function useTakesById(takeIds: readonly string[]) {
  const { data, error, mutate } = useSWR<TakeResponse[], Error>(
    takeIds.length > 0 ? ['takes by id', ...takeIds] : null,
    async () => {
      const asked = takeIds.map((id) => requestJson(paths.take(id), takeResponse));
      const answers = await Promise.allSettled(asked);
      const found = answers.flatMap((answer) => (answer.status === 'fulfilled' ? answer.value : []));
      const failed = answers.find((answer) => answer.status === 'rejected');
      if (found.length === 0 && failed) throw failed.reason as Error;
      return found;
    },
  );
  return { takes: takeIds.length === 0 ? [] : data, error, retry: () => void mutate() };
}
