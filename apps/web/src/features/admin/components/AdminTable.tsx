import { Box, chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';
import { TextButton } from '../../../components/Button';
import { FieldError } from '../../../components/FieldError';

export const Row = chakra('tr', { base: { borderTop: '1px solid', borderColor: 'rule' } });
export const Cell = chakra('td', {
  base: {
    paddingY: '10px',
    paddingRight: '20px',
    verticalAlign: 'baseline',
    _last: { paddingRight: 0, textAlign: 'right' },
    // On a phone a row is a paragraph: its cells stand below each other.
    display: { base: 'block', md: 'table-cell' },
    '@media (max-width: 47.99rem)': { paddingY: '2px', textAlign: 'left!' },
  },
});

/** A ruled table; on a phone each row becomes a short paragraph. */
export function AdminTable({
  label,
  heads,
  children,
}: {
  label: string;
  heads: string[];
  children: ReactNode;
}) {
  return (
    <chakra.table
      aria-label={label}
      width="100%"
      fontSize="16px"
      lineHeight="22px"
      borderCollapse="collapse"
      borderBottom="1px solid"
      borderColor="rule"
      display={{ base: 'block', md: 'table' }}
      css={{
        '@media (max-width: 47.99rem)': {
          '& tbody, & tr': { display: 'block' },
          '& tr': { paddingBlock: '8px' },
        },
      }}
    >
      <chakra.thead display={{ base: 'none', md: 'table-header-group' }}>
        <tr>
          {heads.map((head) => (
            <chakra.th
              key={head}
              scope="col"
              textAlign="left"
              fontSize="caption"
              fontWeight={600}
              color="ink.muted"
              paddingBottom="4px"
              _last={{ textAlign: 'right' }}
            >
              {head}
            </chakra.th>
          ))}
        </tr>
      </chakra.thead>
      <tbody>{children}</tbody>
    </chakra.table>
  );
}

/** Loading, error with another try, or nothing yet; null where there are rows to show. */
export function TableState({
  what,
  rows,
  error,
  onRetry,
  empty,
}: {
  what: string;
  rows: readonly unknown[] | undefined;
  error: Error | undefined;
  onRetry: () => void;
  empty: string;
}) {
  if (error)
    return (
      <FieldError>
        {error.message} <TextButton onClick={onRetry}>Try again</TextButton>
      </FieldError>
    );
  if (!rows) return <Box minHeight="90px" role="status" aria-label={`Loading ${what}`} />;
  return rows.length === 0 ? <Box color="ink.muted">{empty}</Box> : null;
}
