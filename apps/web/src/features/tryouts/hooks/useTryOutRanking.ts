import {
  paths,
  tryOutRankingResponse,
  type TryOutMeasure,
  type TryOutPolarity,
  type TryOutRankingResponse,
  type TryOutResponse,
} from '@thudline/contracts';
import useSWR from 'swr';
import { errorToShow, requestJson } from '../../../lib/apiClient';

export interface RankBy {
  measure: TryOutMeasure;
  polarity: TryOutPolarity;
  also: TryOutMeasure | null;
}

export const defaultRank: RankBy = { measure: 'low-end', polarity: 'best-polarity', also: null };

export function rankingKey(tryOutId: string, { measure, polarity, also }: RankBy): string {
  const query = new URLSearchParams({ measure, polarity, ...(also ? { also } : {}) });
  return `${paths.tryOutRanking(tryOutId)}?${query.toString()}`;
}

/** The takes by one measure or two; what it showed before stays until the new order is there. */
export function useTryOutRanking(tryOut: TryOutResponse | undefined, by: RankBy) {
  // A take that gets its sheet changes the ranking, so its sheets name it.
  const sheets = tryOut?.places.filter(({ take }) => take?.hasReport).length ?? 0;
  const { data, error, mutate } = useSWR<TryOutRankingResponse, Error>(
    tryOut && [rankingKey(tryOut.id, by), sheets],
    ([path]: [string, number]) => requestJson(path, tryOutRankingResponse),
    { keepPreviousData: true },
  );
  return { ranking: data, error: errorToShow(data, error), retry: () => void mutate() };
}
