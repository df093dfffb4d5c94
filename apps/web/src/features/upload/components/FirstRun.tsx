import { Box, chakra } from '@chakra-ui/react';
import { Headline } from '../../../components/Headline';
import { CheckTake } from './CheckTake';
import { DropBox } from './DropBox';

/** The upload page for someone who has no take yet: what to play, then where to drop it. */
export function FirstRun({ onChoose }: { onChoose: () => void }) {
  return (
    <>
      <Headline marginTop={{ base: '8px', lg: '17px' }} maxWidth="704px">
        <b>Your first take needs 45 seconds of playing.</b> Kick and overhead, recorded together, nothing on
        them.
      </Headline>
      <Box
        marginTop="21px"
        display="grid"
        gridTemplateColumns={{ base: '1fr', lg: 'minmax(0, 1fr) minmax(0, 1fr)' }}
        columnGap="56px"
        rowGap="28px"
      >
        <CheckTake />
        <Box as="section" aria-labelledby="drop-here" _print={{ display: 'none' }}>
          <chakra.h2 id="drop-here" fontWeight={600} lineHeight="26px" marginBottom="9px">
            Then drop the files here
          </chakra.h2>
          <DropBox onChoose={onChoose} />
        </Box>
      </Box>
    </>
  );
}
