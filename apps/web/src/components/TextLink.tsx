import { chakra } from '@chakra-ui/react';
import { Link } from 'react-router-dom';

/** A link in running text: a hairline under it. */
export const TextLink = chakra(Link, {
  base: {
    color: 'inherit',
    textDecoration: 'underline',
    textDecorationThickness: '1px',
    textUnderlineOffset: '3px',
  },
});
