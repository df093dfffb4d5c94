import { Box, Flex, chakra } from '@chakra-ui/react';
import type { NoteResponse } from '@thudline/contracts';
import { useState } from 'react';
import { TextButton } from '../../../components/Button';
import { FieldError } from '../../../components/FieldError';
import { dateTime } from '../../../lib/format';
import { pinWords, writerWords } from '../noteWords';
import { useNotesBench } from '../notesBench';
import { NoteEdit } from './NoteEdit';
import { NoteText } from './NoteText';
import { PlayFromThere } from './PlayFromThere';
import { ReportForm } from './ReportForm';
import { AskedFor } from './AskedFor';

/** One note or answer: who, about what, the words, what it asks for, and what can be done with it. */
export function NoteView({ note, letter }: { note: NoteResponse; letter?: string }) {
  const { writing } = useNotesBench();
  const editing = writing?.what === 'edit' && writing.note === note.id;
  const reporting = writing?.what === 'report' && writing.note === note.id;
  if (note.isRemoved)
    return (
      <Box color="ink.muted" fontSize="caption">
        {letter && <b>{letter} </b>}
        This note was removed.
      </Box>
    );
  return (
    <>
      <NoteHead note={note} letter={letter} />
      {editing ? <NoteEdit note={note} /> : <NoteText body={note.body} />}
      <AskedFor items={note.nextItems} />
      {!editing && <NoteFoot note={note} />}
      {reporting && <ReportForm noteId={note.id} />}
    </>
  );
}

function NoteHead({ note, letter }: { note: NoteResponse; letter?: string }) {
  const { report, isNew } = useNotesBench();
  const about = note.parentId === null ? pinWords(note.pin, report) : '';
  return (
    <Box fontSize="caption" lineHeight="19px" color="ink.muted">
      <chakra.b color="ink" fontWeight={600}>
        {letter && `${letter} `}
        {writerWords(note.from)}
      </chakra.b>
      {about && ` · ${about}`}
      {isNew(note) && (
        <chakra.b color="watch" fontWeight={600}>
          {' '}
          · new
        </chakra.b>
      )}
    </Box>
  );
}

/** Each does one thing; none is needed to read. */
function NoteFoot({ note }: { note: NoteResponse }) {
  const { list, setWriting, remove } = useNotesBench();
  const [failure, setFailure] = useState('');
  const { edit, remove: mayRemove, report } = note.rights;
  const removeIt = async () => {
    setFailure('');
    try {
      await remove(note);
    } catch (error) {
      setFailure(error instanceof Error ? error.message : 'It could not be removed. Try again.');
    }
  };
  return (
    <>
      <Flex
        columnGap="12px"
        wrap="wrap"
        fontSize="caption"
        lineHeight="26px"
        color="ink.muted"
        _print={{ display: 'none' }}
      >
        <PlayFromThere pin={note.pin} isAnswer={note.parentId !== null} />
        {list.mayNote && (
          <TextButton onClick={() => setWriting({ what: 'answer', to: note.parentId ?? note.id })}>
            Answer
          </TextButton>
        )}
        {edit && <TextButton onClick={() => setWriting({ what: 'edit', note: note.id })}>Edit</TextButton>}
        {mayRemove && <TextButton onClick={() => void removeIt()}>Remove</TextButton>}
        {report && (
          <TextButton onClick={() => setWriting({ what: 'report', note: note.id })}>Report</TextButton>
        )}
        <span>
          <time dateTime={note.createdAt}>{dateTime(note.createdAt)}</time>
          {note.editedAt && <span title={dateTime(note.editedAt)}>, edited</span>}
        </span>
      </Flex>
      {failure && <FieldError>{failure}</FieldError>}
    </>
  );
}
