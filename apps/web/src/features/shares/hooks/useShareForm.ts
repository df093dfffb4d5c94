import type { CreatedShareResponse, ShareSubject } from '@thudline/contracts';
import { useState, type FormEvent } from 'react';
import { draftFault, emptyDraft, shareRequest, type ShareDraft } from '../shareDraft';
import { useShareActions } from './useShareActions';

/** A link being written, and sending it; what was written stays when it fails. */
export function useShareForm(subject: ShareSubject, onCreated: (share: CreatedShareResponse) => void) {
  const { create } = useShareActions();
  const [draft, setDraft] = useState<ShareDraft>(emptyDraft);
  const [busy, setBusy] = useState(false);
  const [failure, setFailure] = useState('');
  const make = async () => {
    const fault = draftFault(draft);
    setFailure(fault);
    if (fault) return;
    setBusy(true);
    try {
      onCreated(await create(shareRequest(subject, draft)));
    } catch (error) {
      setFailure(error instanceof Error ? error.message : 'The link could not be made. Try again.');
      setBusy(false);
    }
  };
  return {
    draft,
    busy,
    failure,
    change: (changed: Partial<ShareDraft>) => setDraft((before) => ({ ...before, ...changed })),
    send: (event: FormEvent) => {
      event.preventDefault();
      void make();
    },
  };
}
