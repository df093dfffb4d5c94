import { paths, type TakeResponse } from '@thudline/contracts';
import { useEffect, useSyncExternalStore } from 'react';
import { useSWRConfig } from 'swr';
import { isTakesKey } from '../../takes/hooks/takesKeys';
import { sendQueue, type PairToSend } from '../upload/sendQueue';
import { sendingWords } from '../upload/sendingWords';

/** The pairs of one try-out on their way; null where none are. */
export function useSendQueue(tryOutId: string) {
  const sending = useSyncExternalStore(sendQueue.subscribe, sendQueue.snapshot);
  const own = sending?.tryOutId === tryOutId ? sending : null;
  const isBusy = own !== null && !sendingWords(own).isOver;
  useAskBeforeClosing(isBusy);
  return { sending: own, isBusy, again: () => sendQueue.again(), stop: () => sendQueue.stop() };
}

/** Starts sending; every take that arrives makes the try-out and the lists fresh. */
export function useSendPairs() {
  const { mutate } = useSWRConfig();
  return (tryOutId: string, pairs: readonly PairToSend[]) => {
    const onSent = (take: TakeResponse) => {
      void mutate(paths.take(take.id), take, { revalidate: false });
      void mutate(paths.tryOut(tryOutId));
      void mutate(isTakesKey);
    };
    sendQueue.start({ tryOutId, pairs, onSent });
  };
}

/** Other pages of the site can be opened meanwhile; closing the tab would stop what is on its way. */
function useAskBeforeClosing(active: boolean) {
  useEffect(() => {
    if (!active) return;
    const ask = (event: BeforeUnloadEvent) => event.preventDefault();
    window.addEventListener('beforeunload', ask);
    return () => window.removeEventListener('beforeunload', ask);
  }, [active]);
}
