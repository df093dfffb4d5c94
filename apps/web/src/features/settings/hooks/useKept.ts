import type { UpdateMeRequest } from '@thudline/contracts';
import { useRef, useState } from 'react';
import { useUpdateMe } from './useUpdateMe';

export interface KeptState {
  /** The last change is on the server. */
  kept: boolean;
  /** Why it is not; empty otherwise. */
  failure: string;
}

/** Keeps each change of one field at once, in the order they were made, and says what became of it. */
export function useKept() {
  const update = useUpdateMe();
  const [state, setState] = useState<KeptState>({ kept: false, failure: '' });
  const last = useRef<Promise<void>>(Promise.resolve());
  const keep = (body: UpdateMeRequest): Promise<void> => {
    setState({ kept: false, failure: '' });
    last.current = last.current.then(async () => {
      try {
        await update(body);
        setState({ kept: true, failure: '' });
      } catch (error) {
        const failure = error instanceof Error ? error.message : 'This could not be kept. Try again.';
        setState({ kept: false, failure });
      }
    });
    return last.current;
  };
  return { ...state, keep };
}
