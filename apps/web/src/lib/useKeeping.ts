import { useState } from 'react';

/** One thing at a time is sent; what went wrong stands on the page. */
export function useKeeping() {
  const [busy, setBusy] = useState(false);
  const [failure, setFailure] = useState('');
  const [isKept, setIsKept] = useState(false);
  const keep = async (act: () => Promise<unknown>) => {
    if (busy) return;
    setBusy(true);
    setFailure('');
    setIsKept(false);
    try {
      await act();
      setIsKept(true);
    } catch (error) {
      setFailure(error instanceof Error ? error.message : 'That did not work. Try again.');
    } finally {
      setBusy(false);
    }
  };
  return { busy, failure, isKept, keep };
}
