import { mailChoiceResponse, paths, type MailChoiceResponse } from '@thudline/contracts';
import useSWR from 'swr';
import { errorToShow, requestJson } from '../../../lib/apiClient';
import { useRefusal } from './useRefusal';

/** What the link at the foot of a mail speaks of; works signed out. */
export function useMailChoice(token: string) {
  const { data, error, mutate } = useSWR<MailChoiceResponse, Error, [string, string]>(
    [paths.readMailChoice, token],
    ([path]) => requestJson(path, mailChoiceResponse, { method: 'POST', body: { token } }),
  );
  const { refusal, act } = useRefusal(mutate);
  return {
    choice: data,
    error: errorToShow(data, error),
    retry: () => void mutate(),
    refusal,
    set: (wanted: boolean) =>
      act(() =>
        requestJson(paths.mailChoice, mailChoiceResponse, { method: 'POST', body: { token, wanted } }),
      ),
  };
}
