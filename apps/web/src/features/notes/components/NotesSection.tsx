import { Box, chakra } from '@chakra-ui/react';
import { plural } from '../../../lib/format';
import { SheetSection } from '../../sheet/components/SheetSection';
import { noteAnchor } from '../noteAnchor';
import type { LetteredThread } from '../noteOrder';
import { pinWords, writerWords } from '../noteWords';
import { useNotesBench } from '../notesBench';
import { NoteBox } from './NoteBox';
import { ThreadView } from './ThreadView';

/** The conversation about the take as a whole, the way to what is pinned above, and the box to write in. */
export function NotesSection({ lettered }: { lettered: LetteredThread[] }) {
  const { list } = useNotesBench();
  const pinned = new Set(lettered.map(({ thread }) => thread.id));
  const others = list.items.filter(({ id }) => !pinned.has(id));
  if (list.items.length === 0 && !list.mayNote) return null;
  const isGuest = list.mayNote && list.needsName;
  return (
    // What is pinned stands in the margins; on paper a section of nothing else is left out.
    <Box _print={others.length === 0 ? { display: 'none' } : undefined}>
      <SheetSection id="notes" title={isGuest ? 'Your answer' : 'Notes'}>
        {list.items.length === 0 && !isGuest && (
          <Box color="ink.muted" marginTop="4px">
            Nobody has written on this sheet yet.
          </Box>
        )}
        {others.map((thread) => (
          <Box
            key={thread.id}
            marginTop="14px"
            paddingLeft="14px"
            borderLeft="1px solid"
            borderColor="margin"
          >
            <ThreadView thread={thread} />
          </Box>
        ))}
        {lettered.length > 0 && <PinnedAbove lettered={lettered} />}
        {list.mayNote && <NoteBox />}
      </SheetSection>
    </Box>
  );
}

function PinnedAbove({ lettered }: { lettered: LetteredThread[] }) {
  const { report } = useNotesBench();
  return (
    <Box marginTop="12px" fontSize="small" color="ink.muted" _print={{ display: 'none' }}>
      {plural(lettered.length, 'note')} beside what {lettered.length === 1 ? 'it speaks' : 'they speak'} of:
      <chakra.ul listStyleType="none">
        {lettered.map(({ thread, letter }) => (
          <li key={thread.id}>
            <chakra.a
              href={`#${noteAnchor(thread.id)}`}
              color="ink"
              display="inline-block"
              paddingY="2px"
              textDecoration="underline"
              textUnderlineOffset="3px"
              textDecorationThickness="1px"
            >
              <b>{letter}</b> {writerWords(thread.from)}, {pinWords(thread.pin, report)}
            </chakra.a>
          </li>
        ))}
      </chakra.ul>
    </Box>
  );
}
