import { createSystem, defaultBaseConfig, defineConfig } from '@chakra-ui/react';
import { semanticTokens, tokens } from './tokens';

const config = defineConfig({
  preflight: true,
  conditions: { dark: '.dark &, .dark&' },
  theme: {
    breakpoints: { sm: '30rem', md: '48rem', lg: '62rem', xl: '80rem' },
    tokens,
    semanticTokens,
  },
  globalCss: {
    '@page': { margin: '12mm' },
    html: { bg: 'paper', color: 'ink', fontFamily: 'body', fontSize: 'body', lineHeight: 1.45 },
    body: {
      bg: 'paper',
      color: 'ink',
      fontVariantNumeric: 'tabular-nums',
      minWidth: '320px',
      _print: { bg: '#fff' },
    },
    '*:focus-visible': { outline: '3px solid', outlineColor: 'overhead', outlineOffset: '2px' },
    'h1, h2, h3': { fontFamily: 'heading', breakAfter: 'avoid' },
    'svg, tr, li': { breakInside: 'avoid' },
    // Heavy words in running text are 600; without this the browser would take the 900 of headlines.
    'b, strong': { fontWeight: 600 },
    'a:not([class])': { textDecoration: 'underline', textUnderlineOffset: '3px' },
  },
});

export const system = createSystem(defaultBaseConfig, config);
