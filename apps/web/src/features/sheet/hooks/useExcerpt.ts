import { paths } from '@thudline/contracts';
import useSWR from 'swr';
import { requestBytes } from '../../../lib/apiClient';

export interface Excerpt {
  sampleRateHz: number;
  /** Where the excerpt begins in the take. */
  startS: number;
  kick: Float32Array<ArrayBuffer>;
  overhead: Float32Array<ArrayBuffer>;
}

/** Reads the float32 answer: one track after the other, kick first. */
export function decodeExcerpt(bytes: Uint8Array, headers: Headers): Excerpt {
  const sampleRateHz = Number(headers.get('X-Sample-Rate-Hz'));
  const frames = Number(headers.get('X-Frames'));
  if (!(sampleRateHz > 0) || bytes.byteLength !== frames * 8)
    throw new Error('The excerpt came in an unknown shape.');
  const samples = new Float32Array(bytes.slice().buffer);
  return {
    sampleRateHz,
    startS: Number(headers.get('X-Start-Frame')) / sampleRateHz,
    kick: samples.slice(0, frames),
    overhead: samples.slice(frames, 2 * frames),
  };
}

/** Both microphones' samples around one hit. */
export function useExcerpt(
  takeId: string | null,
  { startS, durationS }: { startS: number; durationS: number },
) {
  const query = new URLSearchParams({
    startS: startS.toFixed(4),
    durationS: durationS.toFixed(4),
  }).toString();
  const { data, error, mutate } = useSWR<Excerpt, Error>(
    takeId && `${paths.excerpt(takeId)}?${query}`,
    async (path: string) => {
      const { bytes, headers } = await requestBytes(path);
      return decodeExcerpt(bytes, headers);
    },
    // No samples of another hit in the meantime: they would be drawn, and heard, under this one's number.
    { revalidateIfStale: false, revalidateOnReconnect: false },
  );
  return { excerpt: data, error, retry: () => void mutate() };
}
