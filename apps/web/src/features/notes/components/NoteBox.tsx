import { Box } from '@chakra-ui/react';
import { useState } from 'react';
import { TextButton } from '../../../components/Button';
import { noteBoxId } from '../noteBox';
import { useNotesBench } from '../notesBench';
import { ReportForm } from './ReportForm';
import { WriteNote } from './WriteNote';

/** The box at the end of the sheet: where a phone writes, and where "Answer" leads. */
export function NoteBox() {
  const { take, list, boxPin } = useNotesBench();
  const isOwn = take.rights.change;
  return (
    <Box id={noteBoxId} marginTop="14px" scrollMarginTop="24px">
      <WriteNote
        wide
        start={boxPin}
        label={isOwn ? 'Your note' : 'Your answer'}
        send={isOwn ? 'Keep the note' : `Send the answer to ${take.player}`}
        remark={
          isOwn
            ? 'Whoever you send this sheet to can read what you begin; an answer, whoever wrote the note.'
            : `${list.needsName ? `No account needed. ${take.player} sees your name` : `${take.player} sees it`} and gets a mail.`
        }
      />
      {!isOwn && <SomethingWrong />}
    </Box>
  );
}

function SomethingWrong() {
  const [asks, setAsks] = useState(false);
  if (asks) return <ReportForm onDone={() => setAsks(false)} />;
  return (
    <Box fontSize="caption" lineHeight="19px" color="ink.muted">
      Something wrong with this sheet?{' '}
      <TextButton paddingY="4px" onClick={() => setAsks(true)}>
        Report it
      </TextButton>
    </Box>
  );
}
