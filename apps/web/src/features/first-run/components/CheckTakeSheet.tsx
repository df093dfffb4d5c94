import { Box, Flex, chakra } from '@chakra-ui/react';
import { ButtonLink } from '../../../components/ButtonLink';
import { Headline } from '../../../components/Headline';
import { SheetPaper } from '../../../components/SheetPaper';
import { CheckTake } from './CheckTake';
import { PrintButton } from './PrintButton';
import { ReadSample } from './ReadSample';

/** The check take as a page of its own: to read before an account is made, and to print for the wall by the kit. */
export function CheckTakeSheet({ signedIn }: { signedIn: boolean }) {
  return (
    <SheetPaper margin={<WhyMargin />}>
      <Headline marginTop={{ base: '8px', lg: '17px' }} maxWidth="704px">
        <b>The check take:</b> 45 seconds of playing, so that everything can be measured.
      </Headline>
      <Box marginTop="10px" marginBottom="18px" lineHeight="26px">
        Kick and overhead, recorded together, nothing on them. Leave the preamps alone while you play.
      </Box>
      <CheckTake />
      <Flex marginTop="18px" columnGap="18px" rowGap="12px" alignItems="center" wrap="wrap">
        <ButtonLink to={signedIn ? '/takes/new' : '/join'}>{signedIn ? 'Add this take' : 'Join'}</ButtonLink>
        <PrintButton />
      </Flex>
      <Box marginTop="18px" _print={{ display: 'none' }}>
        <ReadSample />
      </Box>
    </SheetPaper>
  );
}

const reasons = [
  { strong: 'Why sit still', rest: 'What is left then is the noise: fans, hum, the preamp itself.' },
  {
    strong: 'Why the kick alone',
    rest: 'With nothing else sounding the sheet can tell when each microphone hears it, and whether the two add up.',
  },
  { strong: 'Why so hard', rest: 'The hardest hit decides the preamp. A timid one lets the next take clip.' },
];

function WhyMargin() {
  return (
    <Box paddingTop={{ base: '4px', lg: '9px' }} lineHeight="22px">
      {reasons.map(({ strong, rest }) => (
        <chakra.p key={strong} marginBottom="16px">
          <b>{strong}</b>
          <br />
          {rest}
        </chakra.p>
      ))}
    </Box>
  );
}
