import { Box } from '@chakra-ui/react';
import type { TakeResponse } from '@thudline/contracts';
import { ButtonLink } from '../../../components/ButtonLink';
import { Headline } from '../../../components/Headline';
import { ProgressSwell } from '../../../components/ProgressSwell';
import { isMeasuring, measuringWords, unmeasuredWords } from '../../takes/rowWords';
import { BigPaper } from './BigPaper';

/** Big print before there is anything to print. */
export function BigMeasuring({ take }: { take: TakeResponse }) {
  const measuring = isMeasuring(take.measurement);
  const { strong, rest } = measuring
    ? { strong: `Take ${take.number} is being measured.`, rest: 'What to do appears here by itself.' }
    : unmeasuredWords(take.measurement);
  const words = measuringWords(take.measurement);
  return (
    <BigPaper
      foot={
        !measuring && (
          <ButtonLink to={`/takes/${take.id}`} look="outline">
            Open the sheet
          </ButtonLink>
        )
      }
    >
      <Headline marginTop="20px">
        <b>{strong}</b> {rest}
      </Headline>
      {measuring && (
        <Box marginTop="34px" fontSize="small" color="ink.muted">
          <ProgressSwell share={take.measurement.progress} label="Measuring" valueText={words} />
          <Box marginTop="6px" aria-live="polite">
            {words}
          </Box>
        </Box>
      )}
    </BigPaper>
  );
}
