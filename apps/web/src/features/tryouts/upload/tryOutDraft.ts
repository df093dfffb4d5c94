import {
  tryOutLimits,
  type TrackRole,
  type TryOutResponse,
  type TryOutSubject,
  type TryOutUnit,
} from '@thudline/contracts';
import { isReady, type FileReading, type PickedFile } from '../../upload/pickedFile';
import { toShown, type LengthUnit } from '../positionWords';
import { groupFiles, pairFile, placed, positionOfName, swapped, withoutFile, type Pair } from './pairs';

/** A try-out that is being put together: takes that are there, and pairs of files to come. */
export interface TryOutDraft {
  takeIds: readonly string[];
  files: readonly PickedFile[];
  pairs: readonly Pair[];
  /** Somebody put pairs right: files that are added later leave these alone. */
  corrected: boolean;
  /** As written, by the key of a pair or the id of a take. */
  positions: Readonly<Record<string, string>>;
  subject: TryOutSubject;
  /** Where the subject is another. */
  differs: string;
  otherUnit: TryOutUnit;
  fewestTakes: number;
  mostTakes: number;
  /** The place that is how things stand now. */
  currentKey: string | null;
}

export type DraftAction =
  | { type: 'added'; files: { id: string; file: File }[] }
  | { type: 'read'; id: string; reading: FileReading }
  | { type: 'removed'; fileId: string }
  | { type: 'pairRemoved'; key: string }
  | { type: 'takeRemoved'; takeId: string }
  | { type: 'placed'; key: string; role: TrackRole; fileId: string }
  | { type: 'swapped'; key: string }
  | { type: 'positionWritten'; key: string; text: string }
  | { type: 'subjectChosen'; subject: TryOutSubject }
  | { type: 'differsWritten'; text: string }
  | { type: 'unitChosen'; unit: TryOutUnit }
  | { type: 'currentChosen'; key: string | null };

/** @param to - the try-out that gets more takes; null for a new one */
export const emptyDraft = (
  takeIds: readonly string[] = [],
  to: TryOutResponse | null = null,
): TryOutDraft => ({
  takeIds,
  files: [],
  pairs: [],
  corrected: false,
  positions: {},
  subject: to?.subject ?? 'overhead-height',
  differs: to?.differs ?? '',
  otherUnit: to?.unit ?? 'label',
  fewestTakes: to ? 1 : tryOutLimits.fewestTakes,
  mostTakes: tryOutLimits.mostTakes - (to?.places.length ?? 0),
  currentKey: null,
});

export function draftReducer(state: TryOutDraft, action: DraftAction): TryOutDraft {
  switch (action.type) {
    case 'added': {
      const added = action.files.map(({ id, file }): PickedFile => ({
        id,
        file,
        reading: { kind: 'reading' },
      }));
      return { ...state, files: [...state.files, ...added] };
    }
    case 'read':
      return regrouped({
        ...state,
        files: state.files.map((picked) =>
          picked.id === action.id ? { ...picked, reading: action.reading } : picked,
        ),
      });
    case 'removed':
      return withoutFiles(state, [action.fileId]);
    case 'pairRemoved': {
      const pair = state.pairs.find(({ key }) => key === action.key);
      return withoutFiles(state, [pair?.kick?.fileId, pair?.overhead?.fileId]);
    }
    case 'takeRemoved':
      return { ...state, takeIds: state.takeIds.filter((id) => id !== action.takeId) };
    case 'placed':
      return { ...state, corrected: true, pairs: placed(state.pairs, action) };
    case 'swapped':
      return { ...state, corrected: true, pairs: swapped(state.pairs, action.key) };
    case 'positionWritten':
      return { ...state, positions: { ...state.positions, [action.key]: action.text } };
    case 'subjectChosen':
      return { ...state, subject: action.subject };
    case 'differsWritten':
      return { ...state, differs: action.text };
    case 'unitChosen':
      return { ...state, otherUnit: action.unit };
    case 'currentChosen':
      return { ...state, currentKey: action.key };
  }
}

/** Once every file is looked at; what was put right stays. */
function regrouped(state: TryOutDraft): TryOutDraft {
  if (state.files.some(({ reading }) => reading.kind === 'reading')) return state;
  const kept = state.corrected ? state.pairs : [];
  const inPairs = new Set(kept.flatMap(({ kick, overhead }) => [kick?.fileId, overhead?.fileId]));
  const loose = state.files.filter(isReady).filter(({ id }) => !inPairs.has(id));
  const grouped = groupFiles(loose.map(pairFile));
  return { ...state, pairs: [...kept, ...grouped] };
}

function withoutFiles(state: TryOutDraft, fileIds: readonly (string | undefined)[]): TryOutDraft {
  const gone = fileIds.filter((id) => id !== undefined);
  return {
    ...state,
    corrected: true,
    files: state.files.filter(({ id }) => !gone.includes(id)),
    pairs: gone.reduce<readonly Pair[]>(withoutFile, state.pairs),
  };
}

export const fileOf = ({ files }: Pick<TryOutDraft, 'files'>, fileId: string | undefined) =>
  files.find((picked) => picked.id === fileId);

/** As written, or as the files' names tell it. */
export function positionText(draft: TryOutDraft, pair: Pair, lengthUnit: LengthUnit): string {
  const written = draft.positions[pair.key];
  if (written !== undefined) return written;
  const name = fileOf(draft, pair.kick?.fileId ?? pair.overhead?.fileId)?.file.name ?? '';
  const told = positionOfName(name);
  if (told === null) return '';
  return String(Number(toShown(told, unitOf(draft), lengthUnit).toFixed(1)));
}

export function unitOf({ subject, otherUnit }: Pick<TryOutDraft, 'subject' | 'otherUnit'>): TryOutUnit {
  if (subject === 'other') return otherUnit;
  return subject === 'kick-angle' ? 'degree' : 'cm';
}
