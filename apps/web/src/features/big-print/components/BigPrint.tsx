import { Box, Flex } from '@chakra-ui/react';
import type { ReportResponse, TakeListItem, TakeResponse } from '@thudline/contracts';
import { TextLink } from '../../../components/TextLink';
import { useNow } from '../../takes/hooks/useNow';
import { relativeDate } from '../../takes/relativeDate';
import { isMeasuring } from '../../takes/rowWords';
import { bigActions } from '../bigActions';
import { AskedNext } from './AskedNext';
import { BigPaper } from './BigPaper';
import { BigTicks } from './BigTicks';
import { BigWords } from './BigWords';

/** Only what to do before the next take, very large. */
export function BigPrint({
  take,
  report,
  next,
}: {
  take: TakeResponse;
  report: ReportResponse;
  next: TakeListItem | null;
}) {
  const now = useNow();
  const actions = bigActions(report);
  return (
    <BigPaper
      foot={
        <>
          {take.rights.change && actions.length > 0 && <BigTicks take={take} actions={actions} />}
          <Foot take={take} next={next} readOnly={!take.rights.change} />
        </>
      }
    >
      <Box as="h1" fontSize="19px" lineHeight="28px" color="ink.muted">
        Take {take.number} · measured {relativeDate(report.measuredAt, now)}
      </Box>
      <Flex as="ul" direction="column" gap="28px" marginTop="22px">
        {actions.map((action) => (
          <BigWords key={action.id} {...action} done={take.tickedActions.includes(action.id)} />
        ))}
        {actions.length === 0 && <NothingToDo report={report} />}
        <AskedNext take={take} />
      </Flex>
    </BigPaper>
  );
}

/** A take that asks for nothing: the line says so itself. */
function NothingToDo({ report }: { report: ReportResponse }) {
  const [first] = report.line;
  return (
    <BigWords status="good" strong={first?.action ?? 'Nothing to change.'} detail={first?.reason ?? ''} />
  );
}

function Foot({
  take,
  next,
  readOnly,
}: {
  take: TakeResponse;
  next: TakeListItem | null;
  readOnly: boolean;
}) {
  return (
    <Box fontSize="small" lineHeight="22px" color="ink.muted" _print={{ display: 'none' }}>
      <Box role="status">{nextWords(next)}</Box>
      {readOnly && 'This phone only reads along: tick on the computer. '}
      <TextLink to={`/takes/${take.id}`}>Read the whole sheet</TextLink>
    </Box>
  );
}

function nextWords(next: TakeListItem | null): string {
  if (!next) return 'The next take appears here by itself.';
  if (isMeasuring(next.measurement))
    return `Take ${next.number} is being measured. It appears here by itself.`;
  return `Take ${next.number} could not be measured. Add it again; it appears here by itself.`;
}
