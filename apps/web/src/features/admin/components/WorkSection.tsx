import { Box } from '@chakra-ui/react';
import type { FailedWork } from '@thudline/contracts';
import { TextButton } from '../../../components/Button';
import { FieldError } from '../../../components/FieldError';
import { dateTime } from '../../../lib/format';
import { relativeDate } from '../../takes/relativeDate';
import { workTold } from '../adminWords';
import { useFailedWork } from '../hooks/useFailedWork';
import { AdminSection } from './AdminSection';
import { AdminTable, Cell, Row, TableState } from './AdminTable';

/** What failed and stayed so, each with its reason and another try. */
export function WorkSection() {
  const { work, error, retry, refusal, doAgain } = useFailedWork();
  return (
    <AdminSection title="Failed work">
      <TableState what="failed work" rows={work} error={error} onRetry={retry} empty="Nothing has failed." />
      {work && work.length > 0 && (
        <AdminTable label="Failed work" heads={['what', 'whose', 'why', 'when', '']}>
          {work.map((each) => (
            <WorkRow key={each.id} work={each} onAgain={() => void doAgain(each)} />
          ))}
        </AdminTable>
      )}
      {refusal && <FieldError>{refusal}</FieldError>}
    </AdminSection>
  );
}

function WorkRow({ work, onAgain }: { work: FailedWork; onAgain: () => void }) {
  const told = workTold(work);
  return (
    <Row>
      <Cell fontWeight={600}>{told}</Cell>
      <Cell>{work.account?.name}</Cell>
      <Cell overflowWrap="anywhere">
        {work.reason}
        {work.againAt && (
          <Box fontSize="caption" color="ink.muted">
            tried again by itself {dateTime(work.againAt)}
          </Box>
        )}
      </Cell>
      <Cell color="ink.muted" whiteSpace="nowrap">
        {relativeDate(work.at, new Date())}
      </Cell>
      <Cell>
        <TextButton minHeight="26px" whiteSpace="nowrap" aria-label={`try ${told} again`} onClick={onAgain}>
          try again
        </TextButton>
      </Cell>
    </Row>
  );
}
