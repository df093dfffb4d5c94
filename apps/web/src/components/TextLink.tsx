import { chakra } from '@chakra-ui/react';
import type { ComponentProps } from 'react';
import { Link } from 'react-router-dom';
import { useLinksAsText } from './LinksAsText';

const Underlined = chakra(Link, {
  base: {
    color: 'inherit',
    textDecoration: 'underline',
    textDecorationThickness: '1px',
    textUnderlineOffset: '3px',
  },
});

/** A link in running text: a hairline under it. */
export function TextLink(props: ComponentProps<typeof Underlined>) {
  return useLinksAsText() ? <span>{props.children}</span> : <Underlined {...props} />;
}
