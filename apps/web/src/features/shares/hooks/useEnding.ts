import { useState } from 'react';
import { useShareActions } from './useShareActions';

/** Ending a link at once, with a way back for as long as the list is open. */
export function useEnding() {
  const { end, restore } = useShareActions();
  const [endedId, setEndedId] = useState<string | null>(null);
  const [failure, setFailure] = useState('');
  const attempt = async (act: () => Promise<void>, nowEnded: string | null) => {
    setFailure('');
    try {
      await act();
      setEndedId(nowEnded);
    } catch (error) {
      setFailure(error instanceof Error ? error.message : 'That did not work. Try again.');
    }
  };
  return {
    /** The link that was ended last. */
    endedId,
    failure,
    end: (shareId: string) => void attempt(() => end(shareId), shareId),
    restore: (shareId: string) => void attempt(() => restore(shareId), null),
    dismiss: () => {
      setEndedId(null);
      setFailure('');
    },
  };
}

export type Ending = ReturnType<typeof useEnding>;
