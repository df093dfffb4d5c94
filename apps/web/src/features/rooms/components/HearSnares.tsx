import { Box, Flex, chakra } from '@chakra-ui/react';
import type { ReportResponse, TakeOfRoom } from '@thudline/contracts';
import type { ReactNode } from 'react';
import { Button, TextButton } from '../../../components/Button';
import { Swell } from '../../../components/Swell';
import { justBefore } from '../../compare/commonTime';
import { useTwoTakes, type Heard } from '../../compare/hooks/useTwoTakes';
import { decibels } from '../../../lib/format';
import { PlayMark } from '../../sheet/components/PlayMark';
import { useReport } from '../../sheet/hooks/useReport';
import { loudSnare } from '../loudSnare';

interface SidesProps {
  before: TakeOfRoom;
  after: TakeOfRoom;
}

/** A hard snare of the take before and of the take after, equally loud, with a switch between them. */
export function HearSnares({ before, after, loading }: SidesProps & { loading: ReactNode }) {
  const [one, other] = [useReport(before.id, true), useReport(after.id, true)];
  const failed = one.error ? one : other.error ? other : null;
  if (failed)
    return (
      <Box role="alert" fontSize="small">
        The takes could not be loaded. {failed.error?.message}{' '}
        <TextButton onClick={failed.retry}>Try again</TextButton>
      </Box>
    );
  if (!one.report || !other.report) return loading;
  return <Snares reports={[one.report, other.report]} numbers={[before.number, after.number]} />;
}

function Snares({
  reports,
  numbers,
}: {
  reports: readonly [ReportResponse, ReportResponse];
  numbers: readonly [number, number];
}) {
  // Both begin at their own snare: the common time's zero.
  const listening = useTwoTakes([onlySnare(reports[0]), onlySnare(reports[1])]);
  const { state } = listening;
  return (
    <Box>
      <Flex columnGap="20px" rowGap="6px" alignItems="center" wrap="wrap">
        <Button
          look="outline"
          aria-pressed={state !== 'stopped'}
          onClick={() => (state === 'stopped' ? listening.play(justBefore(0)) : listening.stop())}
        >
          <PlayMark playing={state !== 'stopped'} />
          {{ stopped: 'A hard snare', loading: 'Loading both…', playing: 'Stop' }[state]}
        </Button>
        <Flex role="group" aria-label="Side that is heard" columnGap="20px">
          {(['before', 'after'] as const).map((side, i) => (
            <SideButton key={side} on={listening.heard === i} onClick={() => listening.choose(i as Heard)}>
              {side}
            </SideButton>
          ))}
        </Flex>
        <Box fontSize="caption" color="ink.muted">
          {loudnessText(numbers, listening.matchesDb)}
        </Box>
      </Flex>
      {listening.failure && (
        <Box role="alert" color="fix" fontSize="small">
          {listening.failure}
        </Box>
      )}
    </Box>
  );
}

function SideButton({ on, onClick, children }: { on: boolean; onClick: () => void; children: ReactNode }) {
  return (
    <chakra.button
      aria-pressed={on}
      position="relative"
      minHeight="36px"
      cursor="pointer"
      color={on ? 'ink' : 'ink.muted'}
      fontWeight={on ? 600 : 400}
      onClick={onClick}
    >
      {children}
      {on && <Swell depthPx={5.5} linePx={1.5} />}
    </chakra.button>
  );
}

function onlySnare(report: ReportResponse): ReportResponse {
  const snare = loudSnare(report.hits);
  return snare ? { ...report, hits: [snare] } : report;
}

/** Nothing is turned down without saying so. */
function loudnessText(numbers: readonly [number, number], matchesDb: readonly number[] | null): string {
  if (!matchesDb) return 'equally loud';
  const louder = matchesDb[0] < matchesDb[1] ? 0 : 1;
  const downDb = Math.abs(matchesDb[louder]);
  return downDb < 0.05
    ? 'equally loud as they are'
    : `equally loud: take ${numbers[louder]} down ${decibels(downDb)}`;
}
