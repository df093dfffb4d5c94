import { Box, Flex, chakra } from '@chakra-ui/react';
import { Headline } from '../../../components/Headline';
import { ShowOnPhone } from '../../big-print/components/ShowOnPhone';
import { CheckTake } from '../../first-run/components/CheckTake';
import { PrintButton } from '../../first-run/components/PrintButton';
import { ReadSample } from '../../first-run/components/ReadSample';
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
        _print={{ display: 'block' }}
      >
        <Box as="section" aria-labelledby="check-take">
          <Head id="check-take">The check take</Head>
          <CheckTake />
          <Flex marginTop="6px" columnGap="17px" wrap="wrap">
            <PrintButton />
            <ShowOnPhone>Send it to my phone</ShowOnPhone>
          </Flex>
        </Box>
        <Box as="section" aria-labelledby="drop-here" _print={{ display: 'none' }}>
          <Head id="drop-here">Then drop the files here</Head>
          <DropBox onChoose={onChoose} />
          <Box marginTop="15px">
            <ReadSample />
          </Box>
        </Box>
      </Box>
    </>
  );
}

const Head = chakra('h2', { base: { fontWeight: 600, lineHeight: '26px', marginBottom: '9px' } });
