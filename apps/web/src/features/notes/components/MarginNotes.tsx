import { Box, chakra } from '@chakra-ui/react';
import { useRef, useState, type ReactNode } from 'react';
import { TextButton } from '../../../components/Button';
import { useMarginTops, type MarginTop } from '../hooks/useMarginTops';
import { noteAnchor } from '../noteAnchor';
import { hairlinePath } from '../noteLayout';
import { startPin, type LetteredThread, type NoteSection } from '../noteOrder';
import { useNotesBench } from '../notesBench';
import { MarginForm } from './MarginForm';
import { ThreadView } from './ThreadView';

const mostShown = 3;
const lineWidthPx = 13;

/** The notes beside one section, each at the height of what it speaks of; further ones are a click away. */
export function MarginNotes({ section, threads }: { section: NoteSection; threads: LetteredThread[] }) {
  const { list, writing } = useNotesBench();
  const [showsAll, setShowsAll] = useState(() => threads.slice(mostShown).some(isAsked));
  const shown = showsAll ? threads : threads.slice(0, mostShown);
  const ref = useRef<HTMLDivElement>(null);
  const tops = useMarginTops(ref, shown);
  const isWriting = writing?.what === 'note' && writing.at === section;
  return (
    <Box ref={ref} display="flex" flexDirection="column" gap="12px">
      {shown.map(({ thread, letter }, i) => (
        <MarginFrame key={thread.id} id={thread.id} top={tops[i]}>
          <ThreadView thread={thread} letter={letter} />
        </MarginFrame>
      ))}
      {threads.length > shown.length && (
        <Box paddingLeft={{ base: '14px', lg: '20px' }} fontSize="small">
          <TextButton onClick={() => setShowsAll(true)}>{threads.length - shown.length} more</TextButton>
        </Box>
      )}
      {list.mayNote && (isWriting ? <MarginForm start={writing.pin} /> : <Invitation section={section} />)}
    </Box>
  );
}

/** The address leads to it, or to an answer in it. */
const isAsked = ({ thread }: LetteredThread) =>
  [thread, ...thread.answers].some(({ id }) => window.location.hash === `#${noteAnchor(id)}`);

function MarginFrame({
  id,
  top: { marginPx, fallPx } = { marginPx: 0, fallPx: 0 },
  children,
}: {
  id: string;
  top?: MarginTop;
  children: ReactNode;
}) {
  return (
    <Box
      as="aside"
      data-margin-note={id}
      position="relative"
      marginTop={{ base: 0, lg: `${marginPx}px` }}
      paddingLeft={{ base: '14px', lg: '20px' }}
      borderLeft={{ base: '1px solid', lg: 'none' }}
      borderColor={{ base: 'margin' }}
      _print={{ paddingLeft: '20px', borderLeft: 'none' }}
    >
      <chakra.svg
        aria-hidden
        display={{ base: 'none', lg: 'block' }}
        position="absolute"
        left="-1px"
        top="10px"
        width={`${lineWidthPx}px`}
        height="1px"
        overflow="visible"
        fill="none"
        stroke="margin"
        _print={{ display: 'block' }}
      >
        <path d={hairlinePath({ widthPx: lineWidthPx, fallPx })} />
      </chakra.svg>
      {children}
    </Box>
  );
}

const QuietUntilLookedAt = chakra('div', {
  base: {
    display: { base: 'none', lg: 'block' },
    paddingLeft: '20px',
    fontSize: 'small',
    color: 'ink.muted',
    '@media (hover: hover)': { opacity: 0 },
    'section:hover &': { opacity: 1 },
    '&:hover': { opacity: 1 },
    '&:focus-within': { opacity: 1 },
    _print: { display: 'none' },
  },
});

/** On a phone the box at the end of the sheet serves. */
function Invitation({ section }: { section: NoteSection }) {
  const { setWriting, momentS } = useNotesBench();
  return (
    <QuietUntilLookedAt>
      <TextButton
        textDecoration="none"
        _hover={{ textDecoration: 'underline' }}
        onClick={() => setWriting({ what: 'note', at: section, pin: startPin(section, momentS()) })}
      >
        Write a note here
      </TextButton>
    </QuietUntilLookedAt>
  );
}
