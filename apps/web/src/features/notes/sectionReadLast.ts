import type { NoteSection } from './noteOrder';

/** The section that was begun last above the middle of the window; none while its reader is at the top. */
export function sectionReadLast(sections: readonly NoteSection[]): NoteSection | null {
  const middle = window.innerHeight / 2;
  return sections.reduce<NoteSection | null>((last, section) => {
    const top = document.getElementById(section)?.getBoundingClientRect().top;
    return top !== undefined && top <= middle ? section : last;
  }, null);
}
