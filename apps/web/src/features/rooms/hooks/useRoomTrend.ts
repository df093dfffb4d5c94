import { paths, roomTrendResponse, type RoomTrendResponse, type TrendFigure } from '@thudline/contracts';
import useSWR from 'swr';
import { errorToShow, requestJson } from '../../../lib/apiClient';

/** One figure of every take of a room; the last one stays while another is read. */
export function useRoomTrend(roomId: string, figure: TrendFigure) {
  const query = new URLSearchParams({ figure }).toString();
  const { data, error, mutate } = useSWR<RoomTrendResponse, Error>(
    `${paths.roomTrend(roomId)}?${query}`,
    (path: string) => requestJson(path, roomTrendResponse),
    { keepPreviousData: true },
  );
  return { trend: data, error: errorToShow(data, error), retry: () => void mutate() };
}
