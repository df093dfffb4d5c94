import { chakra } from '@chakra-ui/react';
import { Button } from '../../../components/Button';
import { useNotesBench } from '../notesBench';

/** Among the names of the sections: how many notes, and how many are new. */
export function ContentsLink() {
  const { list, isNew } = useNotesBench();
  const notes = list.items.flatMap((thread) => [thread, ...thread.answers]);
  const fresh = notes.filter(isNew).length;
  if (notes.length === 0 && !list.mayNote) return null;
  return (
    <chakra.a href="#notes" display="inline-block" paddingY="3px">
      <chakra.b fontWeight={600}>Notes</chakra.b>
      {notes.length > 0 && <chakra.span color="ink.muted"> {notes.length}</chakra.span>}
      {fresh > 0 && <chakra.span color="watch">, {fresh} new</chakra.span>}
    </chakra.a>
  );
}

/** For whoever the sheet was sent to: jumps to the box, about the section read last. */
export function AnswerButton() {
  const { take, list, writeInBox } = useNotesBench();
  if (take.rights.change || !list.mayNote) return null;
  return (
    <Button look="outline" onClick={writeInBox}>
      Answer
    </Button>
  );
}
