import { Box, chakra } from '@chakra-ui/react';
import { useWidth } from '../../../lib/useWidth';
import { pinRows } from '../noteLayout';
import type { LetteredThread } from '../noteOrder';
import { pinWords, writerWords } from '../noteWords';
import { useNotesBench } from '../notesBench';
import { noteAnchor } from '../noteAnchor';
import { playFrom } from '../playFrom';

const pinPx = 24;

const Pin = chakra('button', {
  base: {
    position: 'absolute',
    width: `${pinPx}px`,
    height: `${pinPx}px`,
    marginLeft: `${-pinPx / 2}px`,
    border: '1.5px solid',
    borderColor: 'ink',
    borderRadius: '12px',
    bg: 'sheet',
    fontSize: '13px',
    lineHeight: '20px',
    fontWeight: 600,
    cursor: 'pointer',
    _hover: { bg: 'target' },
    // A stem up to the axis.
    _before: {
      content: '""',
      position: 'absolute',
      left: '50%',
      bottom: '100%',
      height: '7px',
      borderLeft: '1.5px solid',
      borderColor: 'ink',
    },
  },
});

/** Notes on the time axis of the whole take: a letter plays from there, or, where nothing may be heard, leads to the note. */
export function TakePins({ lettered }: { lettered: LetteredThread[] }) {
  const { report, take, listening } = useNotesBench();
  const { ref, widthPx } = useWidth<HTMLDivElement>();
  const pinned = lettered
    .flatMap((each) => ('timeS' in each.thread.pin ? [{ ...each, timeS: each.thread.pin.timeS }] : []))
    .sort((a, b) => a.timeS - b.timeS);
  const places = pinRows(
    pinned.map(({ timeS }) => (timeS / Math.max(report.durationS, 1e-3)) * widthPx),
    pinPx + 2,
  );
  const rows = Math.max(0, ...places.map(({ row }) => row + 1));
  if (rows === 0) return null;
  return (
    <Box
      ref={ref}
      role="group"
      aria-label="Notes on the take"
      position="relative"
      // On paper the letters behind the sentences do.
      _print={{ display: 'none' }}
      height={`${rows * (pinPx + 6) + 4}px`}
    >
      {pinned.map(({ thread, letter, timeS }, i) => (
        <Pin
          key={thread.id}
          left={`${places[i]?.xPx ?? 0}px`}
          top={`${(places[i]?.row ?? 0) * (pinPx + 6) + 6}px`}
          aria-label={`${take.rights.listen ? 'Play from' : 'Read'} note ${letter}, ${writerWords(thread.from)}, ${pinWords(thread.pin, report)}`}
          onClick={() =>
            take.rights.listen
              ? playFrom(listening, timeS)
              : document.getElementById(noteAnchor(thread.id))?.focus()
          }
        >
          {letter}
        </Pin>
      ))}
    </Box>
  );
}
