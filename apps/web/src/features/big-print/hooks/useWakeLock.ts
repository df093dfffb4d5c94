import { useEffect } from 'react';

/** Keeps the screen on while the page is in front, where the browser can; elsewhere the screen goes dark as ever. */
export function useWakeLock() {
  useEffect(() => {
    if (!('wakeLock' in navigator)) return;
    let sentinel: WakeLockSentinel | undefined;
    let left = false;
    const keepOn = async () => {
      if (document.visibilityState !== 'visible') return;
      try {
        const granted = await navigator.wakeLock.request('screen');
        if (left) await granted.release();
        else sentinel = granted;
      } catch (error) {
        // A browser low on battery refuses with NotAllowedError: the page works without.
        if (!(error instanceof DOMException)) throw error;
      }
    };
    const onVisible = () => void keepOn();
    onVisible();
    // The browser lets go whenever the page is hidden.
    document.addEventListener('visibilitychange', onVisible);
    return () => {
      left = true;
      document.removeEventListener('visibilitychange', onVisible);
      void sentinel?.release();
    };
  }, []);
}
