import { paths } from '@thudline/contracts';
import useSWR from 'swr';
import { requestBytes } from '../../../lib/apiClient';

export interface TakePeaks {
  /** For each step the largest absolute sample, 0–1, one array a track: kick, overhead. */
  outlines: Float32Array[];
}

/** Reads lowest and highest of each step (int8, 127 is full scale) as the outline they make. */
export function decodeOutlines(bytes: Uint8Array, headers: Headers): TakePeaks {
  const steps = Number(headers.get('X-Steps'));
  const tracks = Number(headers.get('X-Tracks'));
  if (!(steps > 0) || bytes.byteLength !== steps * tracks * 2)
    throw new Error('The outlines came in an unknown shape.');
  const values = new Int8Array(bytes.slice().buffer);
  const outlines = Array.from({ length: tracks }, (_, track) =>
    Float32Array.from({ length: steps }, (_unused, step) => {
      const at = (track * steps + step) * 2;
      return Math.max(Math.abs(values[at]), Math.abs(values[at + 1])) / 127;
    }),
  );
  return { outlines };
}

/** Both outlines of a whole take, fine enough for a wide screen. */
export function usePeaks(takeId: string) {
  const { data, error, mutate } = useSWR<TakePeaks, Error>(
    `${paths.peaks(takeId)}?steps=1500`,
    async (path: string) => {
      const { bytes, headers } = await requestBytes(path);
      return decodeOutlines(bytes, headers);
    },
    { revalidateIfStale: false, revalidateOnReconnect: false },
  );
  return { peaks: data, error, retry: () => void mutate() };
}
