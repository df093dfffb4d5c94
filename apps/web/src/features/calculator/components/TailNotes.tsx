import { Box } from '@chakra-ui/react';
import { paths } from '@thudline/contracts';
import { MarginNote } from '../../sheet/components/RuledSheet';
import { useTrend } from '../../rooms/hooks/useTrend';
import { measuredWords } from '../calculatorWords';
import type { BandEstimate } from '../tailEstimate';

/** What was measured in this room beside what is estimated: not the same thing. */
export function MeasuredNote({ roomId, bands }: { roomId: string; bands: readonly BandEstimate[] }) {
  const { trend, error } = useTrend(paths.roomTrend(roomId), 'decay-1000');
  const estimateS = bands.find(({ centreHz }) => centreHz === 1000)?.before.eyringS ?? null;
  return (
    <MarginNote from="a Thudline" about="measured beside it">
      {error
        ? 'What was measured here could not be read.'
        : trend
          ? measuredWords(trend.points, estimateS)
          : '…'}
    </MarginNote>
  );
}

/** In one place, where somebody may begin to build. */
export function BuildingCaution() {
  return (
    <MarginNote from="Before you build">
      <Box color="ink.muted" fontSize="caption" lineHeight="19px">
        Hanging something overhead or building a panel? Fix it so that it can’t fall, check that the material
        resists fire, keep it away from lamps and heaters, and wear a mask, gloves and goggles when you cut
        wool. Ask a qualified person about structure and wiring. Local codes come first.
      </Box>
    </MarginNote>
  );
}
