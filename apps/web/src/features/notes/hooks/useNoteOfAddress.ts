import { useEffect, useRef } from 'react';

/** Mails lead to one note: it comes into view as soon as it is on the page, once. */
export function useNoteOfAddress() {
  const shown = useRef('');
  useEffect(() => {
    const { hash } = window.location;
    if (!hash.startsWith('#note-') || shown.current === hash) return;
    const note = document.getElementById(hash.slice(1));
    if (!note) return;
    shown.current = hash;
    note.scrollIntoView({ block: 'center' });
    note.focus({ preventScroll: true });
  });
}
