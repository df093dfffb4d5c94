import { Box } from '@chakra-ui/react';
import type { TryOutResponse } from '@thudline/contracts';
import { ProgressSwell } from '../../../components/ProgressSwell';
import { measuringProgress } from '../measuringProgress';

/** How far all measurements of the try-out are together; nothing once they have ended. */
export function MeasuringPlaces({ tryOut }: { tryOut: TryOutResponse }) {
  const progress = measuringProgress(tryOut);
  if (progress.waiting === 0) return null;
  const words = `${progress.done} of ${progress.total} takes measured`;
  return (
    <Box marginTop="18px" maxWidth="420px">
      <ProgressSwell share={progress.share} label="Measuring the takes" valueText={words} />
      <Box role="status" marginTop="6px" fontSize="caption" color="ink.muted">
        {words}
      </Box>
    </Box>
  );
}
