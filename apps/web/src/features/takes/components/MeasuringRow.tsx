import { Box, Flex } from '@chakra-ui/react';
import type { TakeListItem } from '@thudline/contracts';
import { useState } from 'react';
import { ProgressSwell } from '../../../components/ProgressSwell';
import { useTakeActions } from '../hooks/useTakeActions';
import { measuringWords, takeName } from '../rowWords';
import { ChooseCell } from './ChooseCell';
import { wideRowGrid } from './tableGrid';
import { TakeCell } from './TakeCell';
import { ActionCell, RowAction, RuledRow } from './TakeRow';

/** A take that is being measured: which step, how far, and a way to stop it. */
export function MeasuringRow({ take, now, canStop }: { take: TakeListItem; now: Date; canStop: boolean }) {
  const { stopMeasuring } = useTakeActions();
  const [failure, setFailure] = useState('');
  const [stopping, setStopping] = useState(false);
  const stop = async () => {
    setStopping(true);
    try {
      await stopMeasuring(take.id);
    } catch (error) {
      setFailure(error instanceof Error ? error.message : 'Stopping did not work. Try again.');
    } finally {
      setStopping(false);
    }
  };
  const words = measuringWords(take.measurement);
  return (
    <RuledRow grid={wideRowGrid}>
      <ChooseCell take={take} chosen={false} />
      <TakeCell take={take} now={now} />
      <Flex
        role="cell"
        gridArea="says"
        alignItems={{ base: 'stretch', lg: 'center' }}
        flexDirection={{ base: 'column', lg: 'row' }}
        columnGap="16px"
        rowGap="8px"
        paddingY={{ base: '6px', lg: 0 }}
        paddingRight={{ base: 0, lg: '133px' }}
        fontSize="16px"
        lineHeight="22px"
      >
        <Box flexShrink={0}>{failure || words}</Box>
        <Box flex="1 1 0" minWidth="80px" marginTop={{ base: 0, lg: '4px' }}>
          <ProgressSwell
            share={take.measurement.progress}
            label={`Measuring ${takeName(take)}`}
            valueText={words}
          />
        </Box>
      </Flex>
      <ActionCell>
        {canStop && (
          <RowAction
            fontSize="small"
            color="ink"
            textDecoration="underline"
            marginRight={{ base: 0, lg: '22px' }}
            disabled={stopping}
            aria-label={`stop measuring ${takeName(take)}`}
            onClick={() => void stop()}
          >
            Stop
          </RowAction>
        )}
      </ActionCell>
    </RuledRow>
  );
}
