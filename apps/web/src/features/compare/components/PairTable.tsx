import { Box, chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';

/** A ruled table of one row a topic, with what belongs to the take before and to the take after beside each other. */
export const PairTable = chakra('table', {
  base: {
    width: '100%',
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
    '& tr': { borderBottom: '1px solid', borderColor: 'rule' },
    '& thead th': { fontWeight: 600 },
    '& tbody th': { color: 'ink.muted' },
  },
});

/** On a phone the topic stands above its two cells. */
export function PairColumns() {
  return (
    <colgroup>
      <Box as="col" width={{ base: '24%', md: '132px' }} />
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
