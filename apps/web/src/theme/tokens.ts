import { defineSemanticTokens, defineTokens } from '@chakra-ui/react';

const both = (light: string, dark: string) => ({ value: { base: light, _dark: dark } });

export const tokens = defineTokens({
  fonts: {
    body: { value: "'Source Sans 3', system-ui, sans-serif" },
    heading: { value: "'Source Sans 3', system-ui, sans-serif" },
  },
  fontSizes: {
    caption: { value: '13px' },
    small: { value: '15px' },
    body: { value: '17px' },
    finding: { value: '18px' },
    section: { value: '24px' },
    linePhone: { value: '28px' },
    line: { value: '36px' },
  },
});

/** Data is cool, judgement is warm. Text at least 4.5:1, graphics at least 3:1, in both themes. */
export const semanticTokens = defineSemanticTokens({
  colors: {
    paper: both('#F0F2EE', '#131517'),
    sheet: both('#FFFFFF', '#1B1E20'),
    ink: { DEFAULT: both('#1A1D21', '#ECEEEA'), muted: both('#565D62', '#A3AAAD') },
    rule: both('#DADDD6', '#31373D'),
    /** Edges of controls: 3:1 on the sheet. */
    edge: both('#7B8286', '#7C8589'),
    margin: both('#C98F86', '#8A5850'),
    kick: both('#5B2A6E', '#C9A2F2'),
    overhead: both('#0A7684', '#5CC3CC'),
    watch: both('#915F00', '#E0B04A'),
    fix: both('#961A14', '#FF8F7E'),
    target: both('#EAEEE6', '#262C29'),
    together: both('#CBD3C6', '#3F4944'),
    hatch: both('#9AA09A', '#6E7773'),
  },
});
