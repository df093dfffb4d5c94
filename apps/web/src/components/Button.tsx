import { chakra } from '@chakra-ui/react';

/** Solid: the one thing to do here. Outline: the other things. Both at least 44 px high. */
export const Button = chakra('button', {
  base: {
    display: 'inline-flex',
    alignItems: 'center',
    justifyContent: 'center',
    gap: '10px',
    minHeight: '44px',
    paddingX: '18px',
    borderRadius: '3px',
    border: '2px solid',
    borderColor: 'ink',
    fontSize: 'body',
    fontWeight: 600,
    lineHeight: 1.2,
    cursor: 'pointer',
    textDecoration: 'none',
    _disabled: { opacity: 0.55, cursor: 'not-allowed' },
    _print: { display: 'none' },
  },
  variants: {
    look: {
      solid: { bg: 'ink', color: 'sheet', _hover: { opacity: 0.88 } },
      outline: { bg: 'sheet', color: 'ink', _hover: { bg: 'target' } },
      plain: { bg: 'transparent', color: 'ink', borderColor: 'transparent', _hover: { bg: 'target' } },
    },
  },
  defaultVariants: { look: 'solid' },
});

/** Text that acts or leads somewhere: a hairline under it. */
export const TextButton = chakra('button', {
  base: {
    display: 'inline',
    bg: 'transparent',
    color: 'inherit',
    cursor: 'pointer',
    textDecoration: 'underline',
    textDecorationThickness: '1px',
    textUnderlineOffset: '3px',
    _disabled: { opacity: 0.55, cursor: 'not-allowed' },
    _print: { display: 'none' },
  },
});
