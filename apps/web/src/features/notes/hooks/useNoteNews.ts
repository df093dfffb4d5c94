import { eventNames, paths } from '@thudline/contracts';
import { useEffect, useEffectEvent, useState } from 'react';

/**
 * Hears of notes as they are written. Only while the page is looked at: a browser opens few lines to one server, and a
 * page that comes to the front again reads its notes anyway.
 */
export function useNoteNews(takeId: string, wanted: boolean, onNews: () => void) {
  const isVisible = useVisible();
  const tell = useEffectEvent(onNews);
  useEffect(() => {
    if (!wanted || !isVisible || typeof EventSource === 'undefined') return;
    const stream = new EventSource(`${paths.events}?takes=${takeId}`);
    stream.addEventListener(eventNames.notes, () => tell());
    return () => stream.close();
  }, [takeId, wanted, isVisible]);
}

function useVisible(): boolean {
  const [isVisible, setVisible] = useState(!document.hidden);
  useEffect(() => {
    const read = () => setVisible(!document.hidden);
    document.addEventListener('visibilitychange', read);
    return () => document.removeEventListener('visibilitychange', read);
  }, []);
  return isVisible;
}
