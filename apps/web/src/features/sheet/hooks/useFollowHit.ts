import { useEffect, useRef } from 'react';
import type { Excerpt } from './useExcerpt';
import type { Listening } from './useListening';

/** While a hit plays on repeat, choosing another goes on with that one as soon as it is there. */
export function useFollowHit({ playing, playHit }: Listening, excerpt: Excerpt | undefined) {
  const heard = useRef(excerpt);
  useEffect(() => {
    if (!excerpt || heard.current === excerpt) return;
    heard.current = excerpt;
    if (playing === 'hit') void playHit(excerpt);
  });
}
