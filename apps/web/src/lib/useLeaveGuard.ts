import { useEffect } from 'react';
import { useBlocker } from 'react-router-dom';

/** State of an address that is gone to because what was written is kept, or taken along. */
export const onPurpose = { onPurpose: true };

const isOnPurpose = (state: unknown) =>
  typeof state === 'object' && state !== null && 'onPurpose' in state && state.onPurpose === true;

/** While `active`, closing the tab or going to another page asks first. */
export function useLeaveGuard(active: boolean) {
  useEffect(() => {
    if (!active) return;
    const ask = (event: BeforeUnloadEvent) => event.preventDefault();
    window.addEventListener('beforeunload', ask);
    return () => window.removeEventListener('beforeunload', ask);
  }, [active]);
  const blocker = useBlocker(({ nextLocation }) => active && !isOnPurpose(nextLocation.state));
  return {
    asking: blocker.state === 'blocked',
    stay: () => blocker.reset?.(),
    leave: () => blocker.proceed?.(),
  };
}
