import { Box, Flex } from '@chakra-ui/react';
import type { TakeResponse } from '@thudline/contracts';
import { useState } from 'react';
import { Button, TextButton } from '../../../components/Button';
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
  const { failure, attempt } = useAttempt('Stopping did not work. Try again.');
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
          {take.rights.change && <TextButton onClick={() => void attempt(stopMeasuring)}>Stop</TextButton>}
        </Flex>
        <Failure>{failure}</Failure>
      </Box>
    </>
  );
}

/** Does something on the server and keeps the sentence where it did not work. */
function useAttempt(neutralWords: string) {
  const [failure, setFailure] = useState('');
  const attempt = async (act: () => Promise<void>) => {
    setFailure('');
    try {
      await act();
    } catch (error) {
      setFailure(error instanceof Error ? error.message : neutralWords);
    }
  };
  return { failure, attempt };
}

function Failure({ children }: { children: string }) {
  if (!children) return null;
  return (
    <Box role="alert" color="fix" fontSize="small" marginTop="8px">
      {children}
    </Box>
  );
}

function NotMeasured({ take }: { take: TakeResponse }) {
  const { strong, rest } = unmeasuredWords(take.measurement);
  const { measureAgain } = useTakeEdits(take);
  const { failure, attempt } = useAttempt('That did not work. Try again in a moment.');
  return (
    <>
      <Headline marginTop="8px">
        <b>{strong}</b> {rest}
      </Headline>
      <Box color="ink.muted" marginTop="12px">
        The files are kept as they came.
      </Box>
      <Flex marginTop="28px" gap="14px">
        {take.rights.change && <Button onClick={() => void attempt(measureAgain)}>Measure it again</Button>}
        <ButtonLink to="/takes" look="outline">
          Back to takes
        </ButtonLink>
      </Flex>
      <Failure>{failure}</Failure>
    </>
  );
}
