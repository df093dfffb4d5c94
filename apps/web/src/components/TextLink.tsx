import { chakra } from '@chakra-ui/react';
import { Link } from 'react-router-dom';

/** A link in running text: a hairline under it. */
export const TextLink = chakra(Link, {
  base: { borderBottom: '1px solid', borderColor: 'currentColor', color: 'inherit', lineHeight: 1.25 },
});
