import { updateTakeRequest } from '@thudline/contracts';
import { useEffect, useRef, useState, type Dispatch } from 'react';
import { ApiError } from '../../../lib/apiClient';
import { canSend, type Arrangement } from '../arrangement';
import { whyNotYet } from '../headline';
import type { PreviousTake } from '../previousTake';
import { takeRequest } from '../takeBody';
import { newUploadKey } from '../uploadKey';
import type { UploadAction, UploadState } from '../uploadState';
import { useTakeUpload } from './useTakeUpload';

/** Sends what is arranged, and says why not where that can't be done yet. */
export function useSending({
  state,
  arranged,
  previous,
  setupId,
  roomId,
  dispatch,
}: {
  state: UploadState;
  arranged: Arrangement;
  previous: PreviousTake | null;
  setupId: string | null;
  roomId: string | null;
  dispatch: Dispatch<UploadAction>;
}) {
  const [notYet, setNotYet] = useState('');
  const { send, stop } = useTakeUpload();
  const latest = useLatest(state);

  const start = async () => {
    const uploadKey = state.uploadKey ?? newUploadKey();
    dispatch({ type: 'sendStarted', newKey: uploadKey, atMs: Date.now() });
    const take = await send({
      request: takeRequest({ ...state, uploadKey }, arranged, {
        previous,
        setupId,
        roomId,
        nowMs: Date.now(),
      }),
      files: arranged.used.map(({ file }) => file),
      onProgress: (sent) => dispatch({ type: 'progressed', report: { ...sent, atMs: Date.now() } }),
      wordsNow: () => ({ title: latest.current.title, note: latest.current.note }),
    });
    dispatch({ type: 'arrived', takeId: take.id });
  };

  const upload = async () => {
    if (state.sending.phase === 'sending' || state.sending.phase === 'arrived') return;
    const problem = problemWith(state, arranged);
    setNotYet(problem);
    if (problem) return;
    try {
      await start();
    } catch (error) {
      dispatch(outcome(error));
    }
  };

  return { notYet, upload, stop, forget: () => setNotYet('') };
}

function problemWith({ title, note }: UploadState, arranged: Arrangement): string {
  if (!canSend(arranged)) return whyNotYet(arranged);
  const words = updateTakeRequest.safeParse({ title, note });
  return words.success ? '' : words.error.issues[0].message;
}

function useLatest(state: UploadState) {
  const latest = useRef(state);
  useEffect(() => {
    latest.current = state;
  });
  return latest;
}

function outcome(error: unknown): UploadAction {
  if (error instanceof DOMException && error.name === 'AbortError') return { type: 'stopped' };
  if (!(error instanceof ApiError))
    return { type: 'refused', message: 'That did not work. Try again in a moment.' };
  if (error.code === 'offline') return { type: 'lost' };
  return { type: 'refused', message: error.message, details: error.details };
}
