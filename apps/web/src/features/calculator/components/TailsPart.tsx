import { Box, Flex, chakra } from '@chakra-ui/react';
import { tailsSentence } from '../calculatorWords';
import { TailRows } from '../pictures/TailRows';
import type { BandEstimate } from '../tailEstimate';
import { PartHead } from './PartHead';
import { TailTable } from './TailTable';

/** The tail by octave, now and with what is planned. */
export function TailsPart({ bands, short }: { bands: readonly BandEstimate[]; short: string }) {
  return (
    <Box as="section" aria-labelledby="tails-head">
      <PartHead id="tails-head">Reverberation, now and with the {short}</PartHead>
      <Box marginTop="6px" aria-live="polite">
        {tailsSentence(bands)}
      </Box>
      <TailRows bands={bands} />
      <Flex fontSize="caption" color="ink.muted" columnGap="20px" wrap="wrap" marginTop="4px">
        <span>
          <Mark /> now
        </span>
        <span>
          <Mark filled /> with the {short}
        </span>
        <span>Norris–Eyring; Sabine beside it</span>
      </Flex>
      <TailTable bands={bands} short={short} />
    </Box>
  );
}

function Mark({ filled = false }: { filled?: boolean }) {
  return (
    <chakra.span
      aria-hidden
      display="inline-block"
      width="11px"
      height="11px"
      borderRadius="50%"
      border="2px solid"
      borderColor="ink"
      bg={filled ? 'ink' : 'sheet'}
      marginRight="5px"
      verticalAlign="-1px"
    />
  );
}
