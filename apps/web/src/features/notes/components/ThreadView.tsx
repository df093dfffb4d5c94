import { Box } from '@chakra-ui/react';
import type { NoteThread } from '@thudline/contracts';
import { noteAnchor } from '../noteAnchor';
import { useNotesBench } from '../notesBench';
import { AnswerForm } from './AnswerForm';
import { NoteView } from './NoteView';

/** A note with its answers. */
export function ThreadView({ thread, letter }: { thread: NoteThread; letter?: string }) {
  const { writing } = useNotesBench();
  const answering = writing?.what === 'answer' && writing.to === thread.id;
  return (
    <Box id={noteAnchor(thread.id)} tabIndex={-1} fontSize="small" lineHeight="21px" scrollMarginTop="24px">
      <NoteView note={thread} letter={letter} />
      {thread.answers.length > 0 && (
        <Box as="ul" listStyleType="none" aria-label="Answers">
          {thread.answers.map((answer) => (
            <Box
              as="li"
              key={answer.id}
              id={noteAnchor(answer.id)}
              tabIndex={-1}
              marginTop="7px"
              paddingLeft="12px"
              borderLeft="1px solid"
              borderColor="rule"
            >
              <NoteView note={answer} />
            </Box>
          ))}
        </Box>
      )}
      {answering && <AnswerForm thread={thread} />}
    </Box>
  );
}
