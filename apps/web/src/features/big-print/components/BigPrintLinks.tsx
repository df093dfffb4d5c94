import { Flex } from '@chakra-ui/react';
import { TextLink } from '../../../components/TextLink';
import { ShowOnPhone } from './ShowOnPhone';

/** In the margin: Big print here, or on a phone propped by the kit. */
export function BigPrintLinks({ takeId, mayAddPhone }: { takeId: string; mayAddPhone: boolean }) {
  return (
    <Flex
      display={{ base: 'none', lg: 'flex' }}
      paddingLeft="20px"
      columnGap="16px"
      fontSize="small"
      color="ink.muted"
      alignItems="center"
      _print={{ display: 'none' }}
    >
      <TextLink to={`/takes/${takeId}/big`}>Big print</TextLink>
      {mayAddPhone && <ShowOnPhone />}
    </Flex>
  );
}
