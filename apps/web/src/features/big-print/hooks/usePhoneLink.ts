import { paths, phoneLinkResponse, type PhoneLinkResponse } from '@thudline/contracts';
import { useEffect, useState } from 'react';
import { requestJson } from '../../../lib/apiClient';

type PhoneLink =
  | { state: 'making' }
  | { state: 'ready'; link: PhoneLinkResponse }
  | { state: 'ended' }
  | { state: 'failed'; message: string };

/** Makes a link that lets one phone in, and knows when its time is over. */
export function usePhoneLink() {
  const [attempt, setAttempt] = useState(0);
  const [phoneLink, setPhoneLink] = useState<PhoneLink>({ state: 'making' });
  useEffect(() => {
    let left = false;
    let timer: ReturnType<typeof setTimeout> | undefined;
    const ready = (link: PhoneLinkResponse) => {
      if (left) return;
      setPhoneLink({ state: 'ready', link });
      const restMs = new Date(link.expiresAt).getTime() - Date.now();
      timer = setTimeout(() => setPhoneLink({ state: 'ended' }), Math.max(0, restMs));
    };
    const failed = (error: unknown) => {
      const message = error instanceof Error ? error.message : 'The code could not be made.';
      if (!left) setPhoneLink({ state: 'failed', message });
    };
    requestJson(paths.phoneLinks, phoneLinkResponse, { method: 'POST' }).then(ready, failed);
    return () => {
      left = true;
      clearTimeout(timer);
    };
  }, [attempt]);
  const again = () => {
    setPhoneLink({ state: 'making' });
    setAttempt(attempt + 1);
  };
  return { phoneLink, again };
}
