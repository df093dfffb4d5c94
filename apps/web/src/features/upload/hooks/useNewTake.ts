import { useLeaveGuard } from '../../../lib/useLeaveGuard';
import { useEffect, useReducer, useRef, type Dispatch } from 'react';
import { useNavigate } from 'react-router-dom';
import { arrangement, type ChosenRole } from '../arrangement';
import { takeHandedOverFiles } from '../droppedFiles';
import { doneActions, type PreviousTake } from '../previousTake';
import { readPickedFile } from '../readPickedFile';
import { newUploadKey } from '../uploadKey';
import {
  emptyUpload,
  uploadReducer,
  type Sending,
  type UploadAction,
  type UploadState,
} from '../uploadState';
import { useSending } from './useSending';
import { useUploadRooms } from './useUploadRooms';
import { useUploadSetups } from './useUploadSetups';

/** The upload page: what was dropped, what is written about it, and sending it. */
export function useNewTake(previous: PreviousTake | null) {
  const setups = useUploadSetups();
  const rooms = useUploadRooms();
  const [state, dispatch] = useReducer(uploadReducer, emptyUpload, withHandedOverFiles);
  const leaving = useLeaveGuard(state.sending.phase === 'sending');
  useOpenSheet(state.sending);
  useReading(state.files, dispatch);
  const arranged = arrangement(state.files, state.chosen);
  const setupId = setups.chosen(state.setupHere);
  const roomId = rooms.chosen(state.roomHere);
  const where = { setupId, roomId };
  const { notYet, upload, stop, forget } = useSending({ state, arranged, previous, ...where, dispatch });

  const pick = (files: readonly File[], how: 'added' | 'replaced' = 'added') => {
    forget();
    if (files.length > 0) dispatch({ type: how, files: files.map(withId) });
  };

  const done = previous ? doneActions(previous, state.tickedHere) : [];
  return {
    state,
    arranged,
    previous,
    follows: state.follows,
    done,
    setups: setups.all,
    setupId,
    chooseSetup: (id: string) => dispatch({ type: 'setupChosen', setupId: id }),
    rooms: rooms.all,
    roomId,
    chooseRoom: (id: string) => {
      rooms.remember(id);
      dispatch({ type: 'roomChosen', roomId: id });
    },
    setFollows: (follows: boolean) => dispatch({ type: 'followsChosen', follows }),
    tick: (id: string, on: boolean) =>
      dispatch({ type: 'changesTicked', actionIds: on ? [...done, id] : done.filter((each) => each !== id) }),
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
