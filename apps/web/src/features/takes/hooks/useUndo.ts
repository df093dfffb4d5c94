import { useState } from 'react';

export interface Done {
  words: string;
  /** What had the focus is gone with it, so the bar takes it. */
  takesFocus?: boolean;
  /** Absent where there is nothing to take back. */
  takeBack?: { act: () => Promise<void>; words: string };
}

/** What was done last and the way back; it stands on the page until it is dismissed. */
export function useUndo() {
  const [done, setDone] = useState<Done | null>(null);
  const [failure, setFailure] = useState('');
  const tell = (next: Done, failed = '') => {
    setDone(next);
    setFailure(failed);
  };
  const takeBack = done?.takeBack;
  const undo = async () => {
    if (!takeBack) return;
    setFailure('');
    try {
      await takeBack.act();
      tell({ words: takeBack.words, takesFocus: true });
    } catch (error) {
      setFailure(failureWords(error));
    }
  };
  return {
    words: done?.words ?? null,
    takesFocus: done?.takesFocus ?? false,
    failure,
    tell,
    undo: takeBack && (() => void undo()),
    dismiss: () => setDone(null),
  };
}

export const failureWords = (error: unknown) =>
  error instanceof Error ? error.message : 'That did not work. Try again.';
