import { appHeader } from '@thudline/contracts';
import { ApiError } from '../../../lib/apiClient';

export interface FormAnswer {
  status: number;
  text: string;
}

interface PostForm {
  path: string;
  form: FormData;
  signal: AbortSignal;
  onProgress: (progress: { loadedBytes: number; totalBytes: number }) => void;
}

const stopped = () => new DOMException('The upload was stopped.', 'AbortError');

/**
 * Sends a form and tells how much has left; `fetch` can't tell that, so this is the one XMLHttpRequest.
 *
 * @throws {ApiError} `offline` when the connection breaks
 * @throws {DOMException} `AbortError` when stopped
 */
export function postForm({ path, form, signal, onProgress }: PostForm): Promise<FormAnswer> {
  if (signal.aborted) return Promise.reject(stopped());
  return new Promise((resolve, reject) => {
    const request = new XMLHttpRequest();
    request.open('POST', path);
    request.setRequestHeader(appHeader.name, appHeader.value);
    request.upload.onprogress = (event) => onProgress({ loadedBytes: event.loaded, totalBytes: event.total });
    request.onload = () => resolve({ status: request.status, text: request.responseText });
    request.onerror = () => reject(new ApiError('offline', 'The connection was lost while sending.'));
    request.onabort = () => reject(stopped());
    signal.addEventListener('abort', () => request.abort(), { once: true });
    request.send(form);
  });
}
