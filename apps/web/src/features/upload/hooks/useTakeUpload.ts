import {
  paths,
  takeResponse,
  updateTakeRequest,
  type CreateTakeRequest,
  type TakeResponse,
} from '@thudline/contracts';
import { useEffect, useRef } from 'react';
import { useSWRConfig } from 'swr';
import { errorFrom, parseJson, refreshSession, requestJson } from '../../../lib/apiClient';
import { isTakesKey } from '../../takes/hooks/takesKeys';
import { postForm, type FormAnswer } from '../api/postForm';
import { takeForm } from '../takeBody';

interface Upload {
  request: CreateTakeRequest;
  files: readonly File[];
  onProgress: (progress: { loadedBytes: number; totalBytes: number }) => void;
  /** Title and note as they stand when the files are there; they may be written while the files travel. */
  wordsNow: () => { title: string; note: string };
}

/** Sends a take, one at a time. Leaving the page stops it. */
export function useTakeUpload() {
  const { mutate } = useSWRConfig();
  const controller = useRef<AbortController | null>(null);
  useEffect(() => () => controller.current?.abort(), []);

  const send = async ({ request, files, onProgress, wordsNow }: Upload): Promise<TakeResponse> => {
    controller.current = new AbortController();
    const { signal } = controller.current;
    const post = () => postForm({ path: paths.takes, form: takeForm(request, files), signal, onProgress });
    let answer = await post();
    if (answer.status === 401 && (await refreshSession())) answer = await post();
    const take = await withWordsNow(await readTake(answer), wordsNow());
    await mutate(paths.take(take.id), take, { revalidate: false });
    void mutate(isTakesKey);
    if (request.setupId) void mutate(paths.setups);
    return take;
  };

  return { send, stop: () => controller.current?.abort() };
}

async function readTake({ status, text }: FormAnswer): Promise<TakeResponse> {
  if (status >= 200 && status < 300) return takeResponse.parse(parseJson(text));
  throw await errorFrom({ status, text: () => Promise.resolve(text) });
}

async function withWordsNow(
  take: TakeResponse,
  words: { title: string; note: string },
): Promise<TakeResponse> {
  const body = updateTakeRequest.parse(words);
  if (body.title === take.title && body.note === take.note) return take;
  return requestJson(paths.take(take.id), takeResponse, { method: 'PATCH', body });
}
