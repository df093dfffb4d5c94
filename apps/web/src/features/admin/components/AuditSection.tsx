import { Box } from '@chakra-ui/react';
import { Button } from '../../../components/Button';
import { dateTime } from '../../../lib/format';
import { auditTold } from '../adminWords';
import { useAudit } from '../hooks/useAudit';
import { AdminSection } from './AdminSection';
import { AdminTable, Cell, Row, TableState } from './AdminTable';

/** Sign-ins, links, roles and deletions, as they happened. */
export function AuditSection() {
  const { entries, error, retry, hasMore, more } = useAudit();
  return (
    <AdminSection title="What happened">
      <TableState
        what="what happened"
        rows={entries}
        error={error}
        onRetry={retry}
        empty="Nothing has happened yet."
      />
      {entries && entries.length > 0 && (
        <AdminTable label="What happened" heads={['when', 'what', 'from']}>
          {entries.map((entry) => (
            <Row key={entry.id}>
              <Cell color="ink.muted" whiteSpace="nowrap">
                {dateTime(entry.at)}
              </Cell>
              <Cell>{auditTold(entry)}</Cell>
              <Cell color="ink.muted" overflowWrap="anywhere">
                {entry.address}
              </Cell>
            </Row>
          ))}
        </AdminTable>
      )}
      {hasMore && (
        <Box marginTop="14px">
          <Button look="outline" onClick={more}>
            Show earlier
          </Button>
        </Box>
      )}
    </AdminSection>
  );
}
