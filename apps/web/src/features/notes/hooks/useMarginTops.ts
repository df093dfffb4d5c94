import { useLayoutEffect, useState, type RefObject } from 'react';
import { noteTopsPx } from '../noteLayout';
import type { LetteredThread } from '../noteOrder';

const gapPx = 12;
/** From a note's top to the middle of its first line, where the hairline meets it. */
const firstLinePx = 10;

export interface MarginTop {
  /** From the note above, or from the top of the margin. */
  marginPx: number;
  /** How far below what it speaks of the note stands. */
  fallPx: number;
}

/** Measures where a margin's notes belong and how tall they are, again whenever either may have changed. */
export function useMarginTops(ref: RefObject<HTMLElement | null>, threads: readonly LetteredThread[]) {
  const [tops, setTops] = useState<MarginTop[]>([]);
  const ids = threads.map(({ thread }) => thread.id).join();
  useLayoutEffect(() => {
    const margin = ref.current;
    const row = margin?.closest('section') ?? margin?.parentElement;
    if (!margin || !row) return;
    const read = () => setTops((before) => keptIfSame(before, measured(margin)));
    read();
    const observer = new ResizeObserver(read);
    observer.observe(row);
    for (const note of notesIn(margin)) observer.observe(note);
    void document.fonts?.ready.then(read);
    return () => observer.disconnect();
  }, [ref, ids]);
  return tops;
}

const notesIn = (margin: HTMLElement) => [...margin.querySelectorAll<HTMLElement>('[data-margin-note]')];

function measured(margin: HTMLElement): MarginTop[] {
  const topPx = margin.getBoundingClientRect().top;
  const notes = notesIn(margin).map((note) => {
    const mark = document.querySelector(`[data-note-mark="${note.dataset.marginNote}"]`);
    const place = mark?.getBoundingClientRect();
    return {
      anchorPx: place ? place.top + place.height / 2 - topPx - firstLinePx : 0,
      heightPx: note.offsetHeight,
    };
  });
  const tops = noteTopsPx(notes, gapPx);
  return notes.map(({ anchorPx }, i) => {
    const above = i === 0 ? 0 : (tops[i - 1] ?? 0) + (notes[i - 1]?.heightPx ?? 0) + gapPx;
    const top = tops[i] ?? 0;
    return { marginPx: Math.round(top - above), fallPx: Math.round(top - anchorPx) };
  });
}

const keptIfSame = (before: MarginTop[], now: MarginTop[]) =>
  JSON.stringify(before) === JSON.stringify(now) ? before : now;
