import { useState } from 'react';

const storageKey = 'thudline.guestName';

/** The name a guest writes under: asked once, kept in their browser. */
export function useGuestName() {
  const [name, setName] = useState(() => localStorage.getItem(storageKey) ?? '');
  return {
    name,
    setName: (next: string) => {
      localStorage.setItem(storageKey, next);
      setName(next);
    },
  };
}
