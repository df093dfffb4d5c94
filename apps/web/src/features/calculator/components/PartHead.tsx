import { chakra } from '@chakra-ui/react';

/** The name of a part of the page. */
export const PartHead = chakra('h2', {
  base: { fontSize: 'section', fontWeight: 900, lineHeight: '30px', marginTop: '24px' },
});
