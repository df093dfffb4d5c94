import { Box, Flex } from '@chakra-ui/react';
import type { ComplaintResponse } from '@thudline/contracts';
import { TextButton } from '../../../components/Button';
import { FieldError } from '../../../components/FieldError';
import { relativeDate } from '../../takes/relativeDate';
import { useComplaints } from '../hooks/useComplaints';
import { AdminSection } from './AdminSection';
import { AdminTable, Cell, Row, TableState } from './AdminTable';

/** What people say is wrong with notes and sheets; a note goes or stays. */
export function ComplaintsSection() {
  const { complaints, error, retry, refusal, settle } = useComplaints();
  return (
    <AdminSection title="Complaints">
      <TableState
        what="complaints"
        rows={complaints}
        error={error}
        onRetry={retry}
        empty="Nobody has complained."
      />
      {complaints && complaints.length > 0 && (
        <AdminTable label="Complaints" heads={['about', 'what is wrong', 'from', 'when', '']}>
          {complaints.map((each) => (
            <ComplaintRow
              key={each.id}
              complaint={each}
              onSettle={(removeNote) => void settle(each, removeNote)}
            />
          ))}
        </AdminTable>
      )}
      {refusal && <FieldError>{refusal}</FieldError>}
    </AdminSection>
  );
}

function ComplaintRow({
  complaint,
  onSettle,
}: {
  complaint: ComplaintResponse;
  onSettle: (removeNote: boolean) => void;
}) {
  const { take, note, reason, from, createdAt, settledAt } = complaint;
  return (
    <Row>
      <Cell overflowWrap="anywhere">
        <b>{note ? `a note by ${note.name ?? 'somebody who has left'}` : 'the sheet'}</b>, take {take.number}{' '}
        of {take.player}
        {note && (
          <Box fontSize="small" color="ink.muted" whiteSpace="pre-wrap" lineClamp={6}>
            {note.body}
          </Box>
        )}
      </Cell>
      <Cell overflowWrap="anywhere" whiteSpace="pre-wrap">
        {reason}
      </Cell>
      <Cell>{from ?? 'a guest'}</Cell>
      <Cell color="ink.muted" whiteSpace="nowrap">
        {relativeDate(createdAt, new Date())}
      </Cell>
      <Cell>
        {settledAt ? (
          <Box color="ink.muted">{note?.isRemoved ? 'removed' : 'settled'}</Box>
        ) : (
          <Flex columnGap="14px" wrap="wrap" justifyContent={{ md: 'flex-end' }}>
            {note && !note.isRemoved && (
              <TextButton minHeight="26px" whiteSpace="nowrap" onClick={() => onSettle(true)}>
                remove the note
              </TextButton>
            )}
            <TextButton minHeight="26px" whiteSpace="nowrap" onClick={() => onSettle(false)}>
              leave it
            </TextButton>
          </Flex>
        )}
      </Cell>
    </Row>
  );
}
