import { Box } from '@chakra-ui/react';
import {
  trendFigures,
  type RoomChangeResponse,
  type RoomTrendResponse,
  type TrendFigure,
} from '@thudline/contracts';
import { useState } from 'react';
import { Button } from '../../../components/Button';
import { FieldError } from '../../../components/FieldError';
import { InlineSelect } from '../../../components/InlineSelect';
import { useTrend } from '../hooks/useTrend';
import { trendWords } from '../roomWords';
import { TrendOverTime } from './TrendOverTime';

const every = '';

interface TrendProps {
  path: string;
  changes?: readonly RoomChangeResponse[];
  first?: TrendFigure;
  of?: 'room' | 'setup';
}

/** "Show **decay at 500 Hz** of **every take**", over time. */
export function Trend({ path, changes = [], first = 'decay-500', of = 'room' }: TrendProps) {
  const [figure, setFigure] = useState<TrendFigure>(first);
  const [setupId, setSetupId] = useState(every);
  const { trend, error, retry } = useTrend(path, figure);
  const setups = setupsOf(trend);
  const chosen = setups.some(({ id }) => id === setupId) ? setupId : every;
  const points = trend?.points.filter(({ setup }) => !chosen || setup?.id === chosen);
  return (
    <Box as="section" aria-label="Over time" marginTop="22px">
      <Box display="none" _print={{ display: 'block' }} fontWeight={600}>
        {trendWords[figure]}
      </Box>
      <Box _print={{ display: 'none' }}>
        Show{' '}
        <InlineSelect
          label="Figure"
          value={figure}
          options={trendFigures}
          words={(each) => trendWords[each]}
          onChange={setFigure}
        />{' '}
        of{' '}
        {of === 'room' && setups.length > 0 ? (
          <InlineSelect
            label="Takes"
            value={chosen}
            options={[every, ...setups.map(({ id }) => id)]}
            words={(id) => setups.find((setup) => setup.id === id)?.name ?? 'every take'}
            onChange={setSetupId}
          />
        ) : (
          'every take'
        )}
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
      {trend && points?.length === 0 && (
        <Box color="ink.muted" marginTop="12px">
          No take of this {of} tells {trendWords[trend.figure]} yet.
        </Box>
      )}
      {trend && points && points.length > 0 && (
        <TrendOverTime
          key={`${trend.figure} ${chosen}`}
          trend={{ figure: trend.figure, points }}
          changes={changes}
        />
      )}
    </Box>
  );
}

function setupsOf(trend: RoomTrendResponse | undefined): { id: string; name: string }[] {
  const named = (trend?.points ?? []).flatMap(({ setup }) => setup ?? []);
  return [...new Map(named.map((setup) => [setup.id, setup])).values()];
}
