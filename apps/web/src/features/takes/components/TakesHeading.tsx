import { Box, Flex, chakra } from '@chakra-ui/react';
import { ButtonLink } from '../../../components/ButtonLink';
import { TextLink } from '../../../components/TextLink';

/** The name of the page and the way to another take. */
export function TakesHeading() {
  return (
    <Flex wrap="wrap" alignItems="center" columnGap="18px" rowGap="6px" minHeight="44px">
      <chakra.h1 fontSize="28px" lineHeight="34px" fontWeight={900} flex={{ base: '1 0 100%', sm: '1' }}>
        Takes
      </chakra.h1>
      <Box fontSize="small" color="ink.muted" display={{ base: 'none', lg: 'block' }}>
        Drop WAV files anywhere on this page
      </Box>
      <TextLink to="/setups">Setups</TextLink>
      <TextLink to="/tryouts">Try-outs</TextLink>
      <TextLink to="/progress">Progress</TextLink>
      <ButtonLink to="/takes/new">Add a take</ButtonLink>
    </Flex>
  );
}
