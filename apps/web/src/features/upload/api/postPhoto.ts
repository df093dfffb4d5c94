import { errorFrom, refreshSession } from '../../../lib/apiClient';
import { postForm } from './postForm';

/**
 * Sends one photo.
 *
 * @returns the answer's text
 * @throws {ApiError} refused
 */
export async function postPhoto({
  path,
  file,
  signal,
}: {
  path: string;
  file: File;
  signal: AbortSignal;
}): Promise<string> {
  const form = new FormData();
  form.append('photo', file, file.name);
  const post = () => postForm({ path, form, signal, onProgress: () => undefined });
  let answer = await post();
  if (answer.status === 401 && (await refreshSession())) answer = await post();
  const { status, text } = answer;
  if (status < 200 || status >= 300) throw await errorFrom({ status, text: () => Promise.resolve(text) });
  return text;
}
