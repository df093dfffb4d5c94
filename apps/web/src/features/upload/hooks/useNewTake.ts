import { updateTakeRequest } from '@thudline/contracts';
import { useEffect, useReducer, useRef, useState, type Dispatch } from 'react';
import { useNavigate } from 'react-router-dom';
import { ApiError } from '../../../lib/apiClient';
import { arrangement, canSend, type ChosenRole } from '../arrangement';
import { takeHandedOverFiles } from '../droppedFiles';
import { whyNotYet } from '../headline';
import { readPickedFile } from '../readPickedFile';
import { takeRequest } from '../takeBody';
import { newUploadKey } from '../uploadKey';
import {
  emptyUpload,
  uploadReducer,
  type Sending,
  type UploadAction,
  type UploadState,
} from '../uploadState';
import { useLeaveGuard } from './useLeaveGuard';
import { useTakeUpload } from './useTakeUpload';

/** The upload page: what was dropped, what is written about it, and sending it. */
export function useNewTake() {
  const [state, dispatch] = useReducer(uploadReducer, emptyUpload, withHandedOverFiles);
  const [notYet, setNotYet] = useState('');
  const { send, stop } = useTakeUpload();
  const leaving = useLeaveGuard(state.sending.phase === 'sending');
  useOpenSheet(state.sending);
  const arranged = arrangement(state.files, state.chosen);
  const latest = useLatest(state);

  useReading(state.files, dispatch);

  const pick = (files: readonly File[], how: 'added' | 'replaced' = 'added') => {
    setNotYet('');
    if (files.length > 0) dispatch({ type: how, files: files.map(withId) });
  };

  const upload = async () => {
    if (state.sending.phase === 'sending') return;
    setNotYet('');
    if (!canSend(arranged)) return setNotYet(whyNotYet(arranged));
    const words = updateTakeRequest.safeParse({ title: state.title, note: state.note });
    if (!words.success) return setNotYet(words.error.issues[0].message);
    const newKey = newUploadKey();
    dispatch({ type: 'sendStarted', newKey, atMs: Date.now() });
    try {
      const take = await send({
        request: takeRequest({ ...state, uploadKey: state.uploadKey ?? newKey }, arranged, Date.now()),
        files: arranged.used.map(({ file }) => file),
        onProgress: (sent) => dispatch({ type: 'progressed', report: { ...sent, atMs: Date.now() } }),
        wordsNow: () => ({ title: latest.current.title, note: latest.current.note }),
      });
      dispatch({ type: 'arrived', takeId: take.id });
    } catch (error) {
      dispatch(outcome(error));
    }
  };

  return {
    state,
    arranged,
    notYet,
    leaving,
    pick,
    upload,
    stop,
    remove: (id: string) => dispatch({ type: 'removed', id }),
    chooseRole: (chosen: ChosenRole) => dispatch({ type: 'roleChosen', chosen }),
    writeTitle: (title: string) => dispatch({ type: 'titleWritten', title }),
    writeNote: (note: string) => dispatch({ type: 'noteWritten', note }),
  };
}

export type NewTake = ReturnType<typeof useNewTake>;

const withId = (file: File) => ({ id: newUploadKey(), file });

/** Files dropped on the list of takes are there from the start. */
function withHandedOverFiles(empty: UploadState): UploadState {
  const files = takeHandedOverFiles();
  return files.length === 0 ? empty : uploadReducer(empty, { type: 'added', files: files.map(withId) });
}

/** Reads each picked file once. */
function useReading(files: UploadState['files'], dispatch: Dispatch<UploadAction>) {
  const started = useRef(new Set<string>());
  useEffect(() => {
    for (const { id, file } of files) {
      if (started.current.has(id)) continue;
      started.current.add(id);
      void readPickedFile(file).then((reading) => dispatch({ type: 'read', id, reading }));
    }
  }, [files, dispatch]);
}

/** Opens the sheet once the take is kept; in an effect, so that the guard has let go by then. */
function useOpenSheet(sending: Sending) {
  const navigate = useNavigate();
  const takeId = sending.phase === 'arrived' ? sending.takeId : null;
  useEffect(() => {
    if (takeId) void navigate(`/takes/${takeId}`);
  }, [takeId, navigate]);
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
