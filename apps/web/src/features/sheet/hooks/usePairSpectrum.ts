import { paths, type ReportResponse } from '@thudline/contracts';
import { decodePairSpectrum, type PairSpectrum } from '@thudline/dsp';
import useSWR from 'swr';
import { requestBytes } from '../../../lib/apiClient';

/** The pair spectrum, from which every choice follows in the browser; null where no kick hit was found. */
export function usePairSpectrum(report: ReportResponse) {
  const layout = report.pairSpectrum;
  const of = new URLSearchParams({ version: report.dspVersion });
  const { data, error, mutate } = useSWR<PairSpectrum, Error>(
    layout ? `${paths.pairSpectrum(report.takeId)}?${of.toString()}` : null,
    async (path: string) => {
      if (!layout) throw new Error('asked for a pair spectrum where there is none');
      return decodePairSpectrum((await requestBytes(path)).bytes, layout);
    },
    { revalidateIfStale: false, revalidateOnReconnect: false },
  );
  return { spectrum: data, error, retry: () => void mutate() };
}
