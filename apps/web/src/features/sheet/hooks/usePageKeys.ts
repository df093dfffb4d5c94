import { useEffect } from 'react';
import { isForPage } from './pageKeys';

/**
 * Single keys of a page; they can be switched off (WCAG 2.1.4).
 *
 * @param act - returns whether the key meant something
 */
export function usePageKeys(singleKeys: boolean, act: (key: string) => boolean) {
  useEffect(() => {
    if (!singleKeys) return;
    const onKeyDown = (event: KeyboardEvent) => {
      if (isForPage(event) && act(event.key)) event.preventDefault();
    };
    document.addEventListener('keydown', onKeyDown);
    return () => document.removeEventListener('keydown', onKeyDown);
  });
}
