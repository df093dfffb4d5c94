import type { ErrorDetails } from '@thudline/contracts';
import { arrangement, type ChosenRole } from './arrangement';
import type { FileReading, PickedFile } from './pickedFile';
import { progressed, uploadStarted, type ProgressReport, type UploadProgress } from './uploadProgress';

export type Sending =
  | { phase: 'choosing' }
  | { phase: 'sending'; progress: UploadProgress }
  | { phase: 'arrived'; takeId: string }
  /** `allSent`: the server had every byte by then and may have kept the take. */
  | { phase: 'stopped'; allSent: boolean }
  /** The connection broke: the same upload can be tried again. */
  | { phase: 'lost' }
  /** The server said no to the take as a whole; what it says of one file stands beside that file. */
  | { phase: 'refused'; message: string };

export interface UploadState {
  /** In the order they were dropped. */
  files: PickedFile[];
  chosen: ChosenRole | null;
  title: string;
  note: string;
  /** Id of the setup chosen here, empty for none; null until something was chosen. */
  setupHere: string | null;
  /** The same of the room. */
  roomHere: string | null;
  /** Whether the take follows the one before it. */
  follows: boolean;
  /** Ids of the earlier sheet's actions as ticked on this page; null until something was ticked here. */
  tickedHere: string[] | null;
  /** The same until files or roles change, so that a take whose answer was lost is not kept twice. */
  uploadKey: string | null;
  sending: Sending;
}

export type UploadAction =
  | { type: 'added'; files: { id: string; file: File }[] }
  | { type: 'replaced'; files: { id: string; file: File }[] }
  | { type: 'read'; id: string; reading: FileReading }
  | { type: 'removed'; id: string }
  | { type: 'roleChosen'; chosen: ChosenRole }
  | { type: 'titleWritten'; title: string }
  | { type: 'noteWritten'; note: string }
  | { type: 'setupChosen'; setupId: string }
  | { type: 'roomChosen'; roomId: string }
  | { type: 'followsChosen'; follows: boolean }
  | { type: 'changesTicked'; actionIds: string[] }
  | { type: 'sendStarted'; newKey: string; atMs: number }
  | { type: 'progressed'; report: ProgressReport }
  | { type: 'arrived'; takeId: string }
  | { type: 'stopped' }
  | { type: 'lost' }
  | { type: 'refused'; message: string; details?: ErrorDetails };

export const emptyUpload: UploadState = {
  files: [],
  chosen: null,
  title: '',
  note: '',
  setupHere: null,
  roomHere: null,
  follows: true,
  tickedHere: null,
  uploadKey: null,
  sending: { phase: 'choosing' },
};

const toPicked = ({ id, file }: { id: string; file: File }): PickedFile => ({
  id,
  file,
  reading: { kind: 'reading' },
});

/** Everything that can happen on the upload page. */
export function uploadReducer(state: UploadState, action: UploadAction): UploadState {
  switch (action.type) {
    case 'added':
      return changed(state, { files: [...state.files, ...action.files.map(toPicked)] });
    case 'replaced':
      return changed(state, { files: action.files.map(toPicked) });
    case 'read':
      return { ...state, files: withReading(state.files, action.id, action.reading) };
    case 'removed':
      return changed(state, { files: state.files.filter(({ id }) => id !== action.id) });
    case 'roleChosen':
      return changed(state, { chosen: action.chosen });
    case 'titleWritten':
      return { ...state, title: action.title };
    case 'noteWritten':
      return { ...state, note: action.note };
    case 'setupChosen':
      return changed(state, { setupHere: action.setupId });
    case 'roomChosen':
      return changed(state, { roomHere: action.roomId });
    case 'followsChosen':
      return changed(state, { follows: action.follows });
    case 'changesTicked':
      return changed(state, { tickedHere: action.actionIds });
    default:
      return sendingReducer(state, action);
  }
}

type SendingAction = Extract<
  UploadAction,
  { type: 'sendStarted' | 'progressed' | 'arrived' | 'stopped' | 'lost' | 'refused' }
>;

function sendingReducer(state: UploadState, action: SendingAction): UploadState {
  switch (action.type) {
    case 'sendStarted':
      return {
        ...state,
        uploadKey: state.uploadKey ?? action.newKey,
        sending: { phase: 'sending', progress: uploadStarted(action.atMs) },
      };
    case 'progressed':
      if (state.sending.phase !== 'sending') return state;
      return {
        ...state,
        sending: { phase: 'sending', progress: progressed(state.sending.progress, action.report) },
      };
    case 'arrived':
      return { ...state, sending: { phase: 'arrived', takeId: action.takeId } };
    case 'stopped':
      return { ...state, sending: { phase: 'stopped', allSent: everythingSent(state.sending) } };
    case 'lost':
      return { ...state, sending: { phase: 'lost' } };
    case 'refused':
      return refused(state, action);
  }
}

function everythingSent(sending: Sending): boolean {
  if (sending.phase !== 'sending') return false;
  const { loadedBytes, totalBytes } = sending.progress;
  return totalBytes > 0 && loadedBytes >= totalBytes;
}

/** A change while files are on their way leaves that upload alone: it can only concern files that aren't part of it. */
function changed(state: UploadState, change: Partial<UploadState>): UploadState {
  if (state.sending.phase === 'sending') return { ...state, ...change };
  return { ...state, ...change, uploadKey: null, sending: { phase: 'choosing' } };
}

function withReading(files: PickedFile[], id: string, reading: FileReading): PickedFile[] {
  return files.map((picked) => (picked.id === id ? { ...picked, reading } : picked));
}

function refused(
  state: UploadState,
  { message, details }: { message: string; details?: ErrorDetails },
): UploadState {
  const { used } = arrangement(state.files, state.chosen);
  const fileId = details?.fileIndex === undefined ? undefined : used[details.fileIndex]?.id;
  if (!fileId) return { ...state, sending: { phase: 'refused', message } };
  return {
    ...state,
    files: withReading(state.files, fileId, { kind: 'refused', message }),
    sending: { phase: 'choosing' },
  };
}
