import { Box } from '@chakra-ui/react';
import { trendFigures, type RoomChangeResponse, type TrendFigure } from '@thudline/contracts';
import { useState } from 'react';
import { Button } from '../../../components/Button';
import { FieldError } from '../../../components/FieldError';
import { InlineSelect } from '../../../components/InlineSelect';
import { useRoomTrend } from '../hooks/useRoomTrend';
import { TrendPicture } from '../pictures/TrendPicture';
import { trendWords } from '../roomWords';

/** "Show **decay at 500 Hz** of every take", over time. */
export function RoomTrend({ roomId, changes }: { roomId: string; changes: readonly RoomChangeResponse[] }) {
  const [figure, setFigure] = useState<TrendFigure>('decay-500');
  const { trend, error, retry } = useRoomTrend(roomId, figure);
  return (
    <Box as="section" aria-label="Over time" marginTop="22px">
      <Box _print={{ display: 'none' }}>
        Show{' '}
        <InlineSelect
          label="Figure"
          value={figure}
          options={trendFigures}
          words={(each) => trendWords[each]}
          onChange={setFigure}
        />{' '}
        of every take
      </Box>
      {error && (
        <Box marginTop="12px">
          <FieldError>{error.message}</FieldError>
          <Button marginTop="12px" look="outline" onClick={retry}>
            Try again
          </Button>
        </Box>
      )}
      {!trend && !error && <Box role="status" aria-label="Loading the figure over time" height="252px" />}
      {trend?.points.length === 0 && (
        <Box color="ink.muted" marginTop="12px">
          No take of this room tells {trendWords[trend.figure]} yet.
        </Box>
      )}
      {trend && trend.points.length > 0 && (
        <>
          <TrendPicture trend={trend} changes={changes} />
          <Box fontSize="caption" color="ink.muted" lineHeight="18px">
            A ring is a take, its bar the spread over hits. The thick line is the middle value between two
            changes.
          </Box>
        </>
      )}
    </Box>
  );
}
