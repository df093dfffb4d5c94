import { chakra } from '@chakra-ui/react';
import type { LetteredThread } from '../noteOrder';
import { writerWords } from '../noteWords';
import { noteAnchor } from '../noteAnchor';

const Letter = chakra('a', {
  base: {
    display: 'inline-block',
    minWidth: '19px',
    height: '19px',
    marginLeft: '4px',
    paddingX: '3px',
    border: '1.5px solid',
    borderColor: 'ink',
    borderRadius: '10px',
    fontSize: '12px',
    lineHeight: '15px',
    fontWeight: 600,
    color: 'ink',
    textAlign: 'center',
    textDecoration: 'none',
    verticalAlign: '1px',
    position: 'relative',
    _after: { content: '""', position: 'absolute', inset: '-5px -3px' },
    _hover: { bg: 'target' },
  },
});

/** The letter behind what a note speaks of; leads to the note. */
export function NoteMark({ lettered: { thread, letter } }: { lettered: LetteredThread }) {
  return (
    <Letter
      href={`#${noteAnchor(thread.id)}`}
      data-note-mark={thread.id}
      aria-label={`Note ${letter}, ${writerWords(thread.from)}`}
      onClick={() => document.getElementById(noteAnchor(thread.id))?.focus()}
    >
      {letter}
    </Letter>
  );
}
