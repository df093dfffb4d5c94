import { lazy } from 'react';

/** Notes come after the words of the sheet: whoever opened a link on a phone reads before they are there. */
export const LazySheetNotes = lazy(async () => ({
  default: (await import('./components/SheetNotes')).SheetNotes,
}));
