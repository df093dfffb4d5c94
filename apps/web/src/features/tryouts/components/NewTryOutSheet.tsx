import { Box, Flex } from '@chakra-ui/react';
import type { MeResponse, TakeResponse, TryOutResponse } from '@thudline/contracts';
import { Button } from '../../../components/Button';
import { FieldError } from '../../../components/FieldError';
import { Headline } from '../../../components/Headline';
import { SheetPaper } from '../../../components/SheetPaper';
import { DropAnywhere } from '../../upload/components/DropAnywhere';
import { useTryOutDraft } from '../hooks/useTryOutDraft';
import { subjectWords } from '../subjectWords';
import { draftWords } from '../upload/draftWords';
import { DraftFiles } from './DraftFiles';
import { DraftPlaces } from './DraftPlaces';
import { SubjectSentence } from './SubjectSentence';

/** Many pairs at once, or takes that are there, become one try-out. */
export function NewTryOutSheet({
  takes,
  to,
  me,
}: {
  takes: readonly TakeResponse[];
  /** The try-out that gets more takes; null for a new one. */
  to: TryOutResponse | null;
  me: MeResponse;
}) {
  const { lengthUnit } = me.settings;
  const bench = useTryOutDraft({ takeIds: takes.map(({ id }) => id), to, lengthUnit });
  const { draft, dispatch, problem, busy } = bench;
  const { strong, rest } = draftWords(draft);
  const sends = draft.pairs.length > 0;
  return (
    <DropAnywhere onFiles={bench.pick}>
      {(choose) => (
        <SheetPaper>
          <Headline marginTop="5px">
            <b>{strong}</b> {rest}
          </Headline>
          {to ? (
            <Box marginTop="16px">What differs is {subjectWords(to).differs}.</Box>
          ) : (
            <SubjectSentence draft={draft} onChange={dispatch} />
          )}
          <DraftPlaces {...{ draft, dispatch, takes, lengthUnit }} />
          <DraftFiles draft={draft} dispatch={dispatch} onChoose={() => choose()} />
          {problem && <FieldError>{problem}</FieldError>}
          <Flex marginTop="18px" columnGap="14px" rowGap="12px" alignItems="center" wrap="wrap">
            <Button type="button" aria-disabled={busy} onClick={() => void bench.make()}>
              {sends || to ? 'Send and rank them' : 'Make the try-out'}
            </Button>
            <Box marginLeft={{ base: 0, lg: 'auto' }} fontSize="small" color="ink.muted">
              {sends
                ? 'Two pairs travel at a time. Files are kept bit for bit.'
                : 'The takes stay where they are.'}
            </Box>
          </Flex>
        </SheetPaper>
      )}
    </DropAnywhere>
  );
}
