import { Box } from '@chakra-ui/react';
import type { LineSentence, ReportResponse, TakeResponse } from '@thudline/contracts';
import { Fragment } from 'react';
import { Headline } from '../../../components/Headline';
import { dateTime } from '../../../lib/format';

export function TakeCaption({ take }: { take: TakeResponse }) {
  const parts = [`Take ${take.number}`, take.title, dateTime(take.recordedAt)].filter(Boolean);
  return (
    <Box color="ink.muted" fontSize="small" lineHeight="22px">
      {parts.join(' · ')}
    </Box>
  );
}

/** The one or two sentences a sheet opens with: what to do is heavy, why is light. */
export function TakeLine({ take, report }: { take: TakeResponse; report: ReportResponse }) {
  return (
    <>
      <TakeCaption take={take} />
      <Headline marginTop="8px" maxWidth="704px">
        <LineWords line={report.line} />
      </Headline>
    </>
  );
}

export function LineWords({ line }: { line: LineSentence[] }) {
  return line.map((sentence, i) => (
    <Fragment key={sentence.action}>
      {i > 0 && ' '}
      <b>{sentence.action}</b> {sentence.reason}
    </Fragment>
  ));
}
