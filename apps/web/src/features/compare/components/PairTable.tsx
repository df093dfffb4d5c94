import { Box, chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';

/** A ruled table of one row a topic, with what belongs to the take before and to the take after beside each other. */
export const PairTable = chakra('table', {
  base: {
    width: '100%',
    // On a phone the topic stands above its two cells; roles keep it a table.
    display: { base: 'block', md: 'table', _print: 'table' },
    '& > colgroup': { display: { base: 'none', md: 'table-column-group', _print: 'table-column-group' } },
    '& > thead': { display: { base: 'block', md: 'table-header-group', _print: 'table-header-group' } },
    '& > tbody': { display: { base: 'block', md: 'table-row-group', _print: 'table-row-group' } },
    tableLayout: 'fixed',
    borderCollapse: 'collapse',
    fontSize: 'small',
    lineHeight: '22px',
    marginTop: '14px',
    '& th, & td': {
      textAlign: 'left',
      verticalAlign: 'top',
      paddingY: '7px',
      paddingRight: { base: '10px', md: '16px' },
      fontWeight: 400,
      overflowWrap: 'anywhere',
    },
    '& tr': {
      borderBottom: '1px solid',
      borderColor: 'rule',
      display: { base: 'grid', md: 'table-row', _print: 'table-row' },
      gridTemplateColumns: '1fr 1fr',
    },
    '& tr > th:first-of-type': {
      gridColumn: '1 / -1',
      paddingBottom: { base: '1px', md: '7px' },
    },
    '& thead th': { fontWeight: 600 },
    '& tbody th': { color: 'ink.muted' },
  },
});

export function PairColumns() {
  return (
    <colgroup>
      <Box as="col" width="132px" />
      <col />
      <col />
    </colgroup>
  );
}

export function MarkedName({ mark, children }: { mark: ReactNode; children: ReactNode }) {
  return (
    <chakra.span display="inline-flex" gap="7px" alignItems="center">
      {mark}
      {children}
    </chakra.span>
  );
}
