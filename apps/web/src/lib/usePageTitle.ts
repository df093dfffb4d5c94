import { useEffect } from 'react';

/** The tab says which page it is, then the product's name. */
export function usePageTitle(title: string) {
  useEffect(() => {
    document.title = title ? `${title} · thudline` : 'thudline';
  }, [title]);
}
