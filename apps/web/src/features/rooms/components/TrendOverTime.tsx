import { Box, Flex } from '@chakra-ui/react';
import type { RoomChangeResponse, RoomTrendResponse } from '@thudline/contracts';
import { useState, type KeyboardEvent } from 'react';
import { TextButton } from '../../../components/Button';
import { plural } from '../../../lib/format';
import { keepFile } from '../../../lib/keepFile';
import { movedView, wholeTime, type TimeView, type ViewMove } from '../pictures/trendLayout';
import { TrendPicture } from '../pictures/TrendPicture';
import { trendValue } from '../roomWords';
import { middleAndSpread, trendCsv } from '../trendFile';
import { TrendTable } from './TrendTable';

const keys: Record<string, ViewMove> = {
  '+': { factor: 0.5 },
  '=': { factor: 0.5 },
  '-': { factor: 2 },
  ArrowLeft: { shift: -0.25 },
  ArrowRight: { shift: 0.25 },
};

interface OverTimeProps {
  trend: RoomTrendResponse;
  changes: readonly RoomChangeResponse[];
}

/** The picture, nearer or wider, with its middle value in words and its numbers beside it. */
export function TrendOverTime({ trend, changes }: OverTimeProps) {
  const { view, move } = useView(wholeTime(trend.points, changes));
  const onKeyDown = (event: KeyboardEvent) => {
    const how = keys[event.key];
    if (!how || event.ctrlKey || event.metaKey || event.altKey) return;
    event.preventDefault();
    move(how);
  };
  const steps: [string, ViewMove, boolean][] = [
    ['nearer', { factor: 0.5 }, true],
    ['wider', { factor: 2 }, view !== null],
    ['sooner', { shift: -0.5 }, view !== null],
    ['later', { shift: 0.5 }, view !== null],
  ];
  return (
    <>
      <Box
        role="group"
        aria-label="Picture over time: plus and minus zoom, the arrows move along"
        tabIndex={0}
        onKeyDown={onKeyDown}
      >
        <TrendPicture trend={trend} changes={changes} view={view} />
      </Box>
      <Box fontSize="caption" color="ink.muted" lineHeight="18px">
        {spreadWords(trend)} A ring is a take, its bar the spread over hits. The thick line is the middle
        value between two changes.
      </Box>
      <Flex
        columnGap="18px"
        wrap="wrap"
        fontSize="small"
        marginTop="6px"
        alignItems="baseline"
        _print={{ display: 'none' }}
      >
        {steps.map(([words, how, can]) => (
          <TextButton key={words} minHeight="32px" disabled={!can} onClick={() => move(how)}>
            {words}
          </TextButton>
        ))}
        <TextButton
          minHeight="32px"
          onClick={() => keepFile(`${trend.figure}.csv`, trendCsv(trend), 'text/csv')}
        >
          keep as CSV
        </TextButton>
        <TrendTable trend={trend} />
      </Flex>
    </>
  );
}

/** @returns null for the view while the whole time is shown */
function useView(whole: TimeView) {
  const [view, setView] = useState<TimeView | null>(null);
  const move = (how: ViewMove) => {
    const next = movedView(view ?? whole, whole, how);
    setView(next.toMs - next.fromMs >= whole.toMs - whole.fromMs ? null : next);
  };
  return { view, move };
}

function spreadWords({ figure, points }: RoomTrendResponse): string {
  const told = middleAndSpread(points.map(({ value }) => value));
  if (!told || points.length < 4) return '';
  const [low, high] = [trendValue(told.low, figure), trendValue(told.high, figure)];
  const half = low === high ? '' : `, half of them between ${low} and ${high}`;
  return `Middle of ${plural(points.length, 'take')}: ${trendValue(told.middle, figure)}${half}.`;
}
