import { roomTrendResponse, type RoomTrendResponse, type TrendFigure } from '@thudline/contracts';
import useSWR from 'swr';
import { errorToShow, requestJson } from '../../../lib/apiClient';

/**
 * One figure of every take of a room or a setup; the last one stays while another is read.
 *
 * @param path - of the room's trend, or of the setup's
 */
export function useTrend(path: string, figure: TrendFigure) {
  const query = new URLSearchParams({ figure }).toString();
  const { data, error, mutate } = useSWR<RoomTrendResponse, Error>(
    `${path}?${query}`,
    (address: string) => requestJson(address, roomTrendResponse),
    { keepPreviousData: true },
  );
  return { trend: data, error: errorToShow(data, error), retry: () => void mutate() };
}
