import { useState } from 'react';
import { doneWords, type ChosenTake } from '../chosenTakes';
import { useTakeActions } from './useTakeActions';

interface Done {
  takes: readonly ChosenTake[];
  what: 'deleted' | 'back';
}

/** Deleting and bringing back; the last of it stands on the page until it is dismissed. */
export function useUndo() {
  const { remove, restore } = useTakeActions();
  const [done, setDone] = useState<Done | null>(null);
  const [failure, setFailure] = useState('');
  const bringBack = async (takes: readonly ChosenTake[]) => {
    setFailure('');
    try {
      await restore(takes.map(({ id }) => id));
      setDone({ takes, what: 'back' });
    } catch (error) {
      setDone((now) => now ?? { takes, what: 'deleted' });
      setFailure(error instanceof Error ? error.message : 'Bringing it back did not work. Try again.');
    }
  };
  return {
    words: done && doneWords(done.takes, done.what),
    failure,
    /** Offers to undo what was done, also where the rest did not work. */
    remove: async (takes: readonly ChosenTake[]) => {
      setFailure('');
      const { gone, error } = await remove(takes.map(({ id }) => id));
      const deleted = takes.filter(({ id }) => gone.includes(id));
      if (deleted.length > 0) setDone({ takes: deleted, what: 'deleted' });
      return { deleted, error };
    },
    bringBack,
    undo: done?.what === 'deleted' ? () => void bringBack(done.takes) : undefined,
    dismiss: () => setDone(null),
  };
}
