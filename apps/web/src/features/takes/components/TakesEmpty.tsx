import { Flex, chakra } from '@chakra-ui/react';
import { ButtonLink } from '../../../components/ButtonLink';
import { Headline } from '../../../components/Headline';
import { TextLink } from '../../../components/TextLink';
import { everyTake, takesAddress } from '../takesQuery';

/** Nothing recorded yet: what a first take needs, and the way there. */
export function TakesEmpty({ deletedTotal }: { deletedTotal: number }) {
  return (
    <>
      <Headline marginTop={{ base: '8px', lg: '17px' }} maxWidth="704px">
        <b>Your first take needs 45 seconds of playing.</b> Kick and overhead, recorded together, nothing on
        them.
      </Headline>
      <Flex marginTop="24px" columnGap="16px" rowGap="10px" alignItems="center" wrap="wrap" color="ink.muted">
        <ButtonLink to="/takes/new">Add your first take</ButtonLink>
        or drop WAV files anywhere on this page
      </Flex>
      {deletedTotal > 0 && (
        <chakra.p marginTop="22px">
          <TextLink to={takesAddress({ ...everyTake, show: 'deleted' })}>restore something deleted</TextLink>
        </chakra.p>
      )}
    </>
  );
}
