import { createContext, useContext, type ReactNode } from 'react';

const AsText = createContext(false);

/** Within, links are text: whoever reads this page was shown what is on it, and nothing that it leads to. */
export function LinksAsText({ children }: { children: ReactNode }) {
  return <AsText.Provider value>{children}</AsText.Provider>;
}

export const useLinksAsText = (): boolean => useContext(AsText);
