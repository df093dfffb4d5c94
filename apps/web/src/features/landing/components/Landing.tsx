import { Box, Flex, chakra } from '@chakra-ui/react';
import { lazy, Suspense } from 'react';
import { ButtonLink } from '../../../components/ButtonLink';
import { Headline } from '../../../components/Headline';
import { RuledSheet, SheetRow } from '../../sheet/components/RuledSheet';
import { useSampleSheet } from '../hooks/useSampleSheet';
import { LiveSheetLoading } from './LiveSheetLoading';

const LiveSheet = lazy(async () => ({ default: (await import('./LiveSheet')).LiveSheet }));

const columns = [
  {
    strong: 'Loud enough, never clipped.',
    rest: 'Every hit on one line, and by how much to turn each preamp.',
  },
  { strong: 'Adding up.', rest: 'Whether the two microphones help or cancel, and what a flip does.' },
  {
    strong: 'What the change did.',
    rest: 'The next take says what became of each, with how sure we are.',
  },
];

/** What it does, for someone who has never seen a sheet; below it a sheet that plays, where there is one. */
export function Landing() {
  const { takeId, error } = useSampleSheet();
  // Most installations have one: until it is known, the page is drawn as if, so that nothing jumps.
  const hasSample = takeId !== null && !error;
  return (
    <RuledSheet>
      <SheetRow note={<ForWhom />}>
        <Headline marginTop={{ base: '8px', lg: '14px' }}>
          <b>Drop in a kick file and an overhead file.</b> Read what to change before the next take.
        </Headline>
        <Flex marginTop={{ base: '20px', lg: '17px' }} gap="14px" alignItems="center" wrap="wrap">
          <ButtonLink to="/join">Join</ButtonLink>
          {hasSample ? (
            <ButtonLink to="/sample" look="outline">
              Read the whole sheet
            </ButtonLink>
          ) : (
            <ButtonLink to="/sign-in" look="outline">
              Sign in
            </ButtonLink>
          )}
          <Box fontSize="small" color="ink.muted">
            Two mono WAV files, or one stereo file.
          </Box>
        </Flex>
        <Columns />
      </SheetRow>
      {hasSample && (
        <Suspense fallback={<LiveSheetLoading />}>
          {takeId ? <LiveSheet takeId={takeId} /> : <LiveSheetLoading />}
        </Suspense>
      )}
      <SheetRow>
        <Box
          borderTop="1px solid"
          borderColor="rule"
          marginTop="28px"
          paddingTop="16px"
          fontSize="small"
          lineHeight="21px"
          color="ink.muted"
        >
          Files are kept bit for bit and come back the same. Nobody sees or hears a take until you send it.
        </Box>
      </SheetRow>
    </RuledSheet>
  );
}

function Columns() {
  return (
    <Box
      marginTop="26px"
      display="grid"
      gridTemplateColumns={{ base: '1fr', md: 'repeat(3, minmax(0, 1fr))' }}
      columnGap="28px"
      rowGap="14px"
    >
      {columns.map(({ strong, rest }) => (
        <chakra.p
          key={strong}
          borderTop="1px solid"
          borderColor="rule"
          paddingTop="10px"
          fontSize="16px"
          lineHeight="23px"
        >
          <b>{strong}</b> {rest}
        </chakra.p>
      ))}
    </Box>
  );
}

function ForWhom() {
  return (
    <Box
      as="aside"
      aria-label="For whom"
      paddingTop={{ base: '8px', lg: '9px' }}
      paddingLeft={{ base: 0, lg: '20px' }}
      fontSize="small"
      lineHeight="22px"
    >
      <b>For whom</b>
      <br />
      Anyone who records a kit with two microphones at home and wants to know if the take is good.
    </Box>
  );
}
