import { Box } from '@chakra-ui/react';
import { tryOutSubjects, type TryOutUnit } from '@thudline/contracts';
import { InlineSelect } from '../../../components/InlineSelect';
import { TextField } from '../../../components/TextField';
import { subjectChoice } from '../subjectWords';
import type { DraftAction, TryOutDraft } from '../upload/tryOutDraft';

const units: readonly TryOutUnit[] = ['label', 'cm', 'degree', 'dB'];
const unitNames: Record<TryOutUnit, string> = {
  label: 'names',
  cm: 'a distance',
  degree: 'an angle',
  dB: 'decibels',
};

/** "What differs is how high the overhead hangs." */
export function SubjectSentence({
  draft,
  onChange,
}: {
  draft: TryOutDraft;
  onChange: (action: DraftAction) => void;
}) {
  return (
    <>
      <Box marginTop="16px" lineHeight="36px">
        What differs is{' '}
        <InlineSelect
          label="What differs"
          value={draft.subject}
          options={tryOutSubjects}
          words={subjectChoice}
          onChange={(subject) => onChange({ type: 'subjectChosen', subject })}
        />
        {draft.subject === 'other' && (
          <>
            , told by{' '}
            <InlineSelect
              label="Told by"
              value={draft.otherUnit}
              options={units}
              words={(unit) => unitNames[unit]}
              onChange={(unit) => onChange({ type: 'unitChosen', unit })}
            />
          </>
        )}
        .
      </Box>
      {draft.subject === 'other' && (
        <Box marginTop="12px" maxWidth="420px">
          <TextField
            label="What differs, in a few words"
            value={draft.differs}
            maxLength={80}
            placeholder="the beater"
            onChange={(text) => onChange({ type: 'differsWritten', text })}
          />
        </Box>
      )}
    </>
  );
}
