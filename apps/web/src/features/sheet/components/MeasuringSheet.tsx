import { Box, Flex } from '@chakra-ui/react';
import type { TakeResponse } from '@thudline/contracts';
import { useState } from 'react';
import { TextButton } from '../../../components/Button';
import { ButtonLink } from '../../../components/ButtonLink';
import { Headline } from '../../../components/Headline';
import { ProgressSwell } from '../../../components/ProgressSwell';
import { isMeasuring, measuringWords, unmeasuredWords } from '../../takes/rowWords';
import { useTakeEdits } from '../hooks/useTakeEdits';
import { RuledSheet, SheetRow } from './RuledSheet';
import { TakeCaption } from './TakeLine';

/** The sheet before there is one: how far the measurement has come, or why there is none. */
export function MeasuringSheet({ take }: { take: TakeResponse }) {
  return (
    <RuledSheet>
      <SheetRow>
        <TakeCaption take={take} />
        <Box minHeight="420px">
          {isMeasuring(take.measurement) ? <Underway take={take} /> : <NotMeasured take={take} />}
        </Box>
      </SheetRow>
    </RuledSheet>
  );
}

function Underway({ take }: { take: TakeResponse }) {
  const { stopMeasuring } = useTakeEdits(take);
  const [failure, setFailure] = useState('');
  const stop = async () => {
    try {
      await stopMeasuring();
    } catch (error) {
      setFailure(error instanceof Error ? error.message : 'Stopping did not work. Try again.');
    }
  };
  const words = measuringWords(take.measurement);
  return (
    <>
      <Headline marginTop="8px">
        <b>This take is being measured.</b> You can leave this page; the sheet waits under Takes.
      </Headline>
      <Box marginTop="34px" maxWidth="490px">
        <ProgressSwell share={take.measurement.progress} label="Measuring" valueText={words} />
        <Flex justifyContent="space-between" fontSize="small" marginTop="6px">
          <Box color="ink.muted" aria-live="polite">
            {words}
          </Box>
          <TextButton onClick={() => void stop()}>Stop</TextButton>
        </Flex>
        {failure && (
          <Box role="alert" color="fix" fontSize="small" marginTop="8px">
            {failure}
          </Box>
        )}
      </Box>
    </>
  );
}

function NotMeasured({ take }: { take: TakeResponse }) {
  const { strong, rest } = unmeasuredWords(take.measurement);
  return (
    <>
      <Headline marginTop="8px">
        <b>{strong}</b> {rest}
      </Headline>
      <Box color="ink.muted" marginTop="12px">
        The files are kept as they came.
      </Box>
      <Flex marginTop="28px" gap="14px">
        <ButtonLink to="/takes/new">Add it again</ButtonLink>
        <ButtonLink to="/takes" look="outline">
          Back to takes
        </ButtonLink>
      </Flex>
    </>
  );
}
