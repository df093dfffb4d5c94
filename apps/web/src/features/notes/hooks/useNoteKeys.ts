import { usePageKeys } from '../../sheet/hooks/usePageKeys';
import { hasSection } from '../aboutChoices';
import { noteSections, startPin } from '../noteOrder';
import type { NotesBench } from '../notesBench';
import { sectionReadLast } from '../sectionReadLast';

/** From here on the margin stands beside the sheet. */
const wide = '(min-width: 62rem)';

/** N writes a note beside what is being read, or at the moment that plays; where there is no margin, in the box at the end. */
export function useNoteKeys(bench: NotesBench) {
  const { settings, list, report, listening, momentS, setWriting, writeInBox } = bench;
  usePageKeys(settings.singleKeys && list.mayNote, (key) => {
    if (key.toLowerCase() !== 'n') return false;
    const read = sectionReadLast(noteSections.filter((each) => hasSection(report, each)));
    const section = listening.playing === 'take' ? 'whole-take' : read;
    if (!section || !window.matchMedia(wide).matches) writeInBox();
    else setWriting({ what: 'note', at: section, pin: startPin(section, momentS()) });
    return true;
  });
}
