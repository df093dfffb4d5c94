import { tryOutLimits, type CreateTryOutRequest, type TryOutPlaceRequest } from '@thudline/contracts';
import { isReady, type ReadyFile } from '../../upload/pickedFile';
import { recordedAt, type RecordedFile } from '../../upload/recordedAt';
import { typedPosition } from '../positionInput';
import { positionWords, type LengthUnit } from '../positionWords';
import { subjectWords } from '../subjectWords';
import { pairRoles, type Pair } from './pairs';
import type { PairToSend } from './sendQueue';
import { fileOf, positionText, unitOf, type TryOutDraft } from './tryOutDraft';

interface Plan {
  body: CreateTryOutRequest;
  pairs: PairToSend[];
}

/** Why it can't be made yet, for whoever tries; empty where it can. */
export function draftProblem(draft: TryOutDraft, lengthUnit: LengthUnit): string {
  const { files, pairs, takeIds } = draft;
  if (files.some(({ reading }) => reading.kind === 'reading'))
    return 'One moment: the files are still being looked at.';
  const count = pairs.length + takeIds.length;
  if (count < draft.fewestTakes)
    return draft.fewestTakes === 1
      ? 'Drop the files of at least one take here.'
      : 'A try-out needs at least two takes. Drop their files here.';
  if (count > draft.mostTakes)
    return `A try-out has at most ${tryOutLimits.mostTakes} takes. Clear ${count - draft.mostTakes}.`;
  if (draft.subject === 'other' && !draft.differs.trim()) return 'Say in a few words what differs.';
  for (const [index, pair] of pairs.entries()) {
    const problem = pairProblem(draft, pair);
    if (problem) return `Pair ${index + 1}: ${problem}`;
  }
  const wrong = placeTexts(draft, lengthUnit).findIndex(
    (text) => typedPosition(text, unitOf(draft), lengthUnit) === null,
  );
  return wrong === -1 ? '' : `Write the position of take ${wrong + 1} as a number.`;
}

/** What is wrong with one pair, to stand beside it. */
export function pairProblem(draft: TryOutDraft, { kick, overhead }: Pair): string {
  if (!kick) return 'its kick file is missing.';
  if (!overhead) return 'its overhead file is missing.';
  const [a, b] = [kick, overhead].map(({ fileId }) => fileOf(draft, fileId)?.reading);
  if (a?.kind !== 'ready' || b?.kind !== 'ready') return '';
  return a.facts.sampleRateHz === b.facts.sampleRateHz
    ? ''
    : 'these two have different sample rates, so they can’t be one take.';
}

/** Takes first, then pairs: the order they stand in. */
export const placeKeys = ({ takeIds, pairs }: TryOutDraft): string[] => [
  ...takeIds,
  ...pairs.map(({ key }) => key),
];

const placeTexts = (draft: TryOutDraft, lengthUnit: LengthUnit): string[] => [
  ...draft.takeIds.map((id) => draft.positions[id] ?? ''),
  ...draft.pairs.map((pair) => positionText(draft, pair, lengthUnit)),
];

/** What is asked of the server, and what is sent after it. */
export function tryOutPlan(
  draft: TryOutDraft,
  { lengthUnit, newKey, nowMs }: { lengthUnit: LengthUnit; newKey: () => string; nowMs: number },
): Plan {
  const { subject } = draft;
  const unit = unitOf(draft);
  const texts = placeTexts(draft, lengthUnit);
  const positionOf = (index: number) =>
    typedPosition(texts[index], unit, lengthUnit) ?? { position: null, label: '' };
  const keys = draft.pairs.map(newKey);
  const differs = subject === 'other' ? draft.differs.trim() : '';
  const places: TryOutPlaceRequest[] = [
    ...draft.takeIds.map((takeId, i) => ({ takeId, ...positionOf(i) })),
    ...draft.pairs.map((pair, i) => ({
      uploadKey: keys[i],
      fileNames: pickedOfPair(draft, pair).map(({ file }) => file.name),
      ...positionOf(draft.takeIds.length + i),
    })),
  ];
  const current = draft.currentKey === null ? -1 : placeKeys(draft).indexOf(draft.currentKey);
  return {
    body: { subject, differs, unit, places, currentIndex: current === -1 ? null : current },
    pairs: draft.pairs.map((pair, i) => {
      const picked = pickedOfPair(draft, pair);
      const where = positionWords(positionOf(draft.takeIds.length + i), unit, lengthUnit);
      return {
        files: picked.map(({ file }) => file),
        request: {
          uploadKey: keys[i],
          title: takeTitle(subjectWords({ subject, differs }).column, where, unit === 'label'),
          note: '',
          recordedAt: recordedAt(picked.map(recordedFile), nowMs),
          doneActions: [],
          tags: [],
          tracks: pairTracks(pair),
        },
      };
    }),
  };
}

/** "Overhead at 100 cm"; "felt beater" where it is a label. */
function takeTitle(column: string, where: string | null, isLabel: boolean): string {
  if (where === null) return '';
  return isLabel ? where : `${column} ${where}`;
}

/** One file where it holds both, kick first otherwise. */
function pickedOfPair(draft: Pick<TryOutDraft, 'files'>, { kick, overhead }: Pair): ReadyFile[] {
  const ids = new Set([kick?.fileId, overhead?.fileId]);
  return [...ids].flatMap((id) => {
    const picked = fileOf(draft, id);
    return picked && isReady(picked) ? picked : [];
  });
}

/** What tells when it was recorded. */
export const recordedFile = ({ file, reading }: ReadyFile): RecordedFile => ({
  lastModified: file.lastModified,
  broadcast: reading.facts.broadcast,
});

export function pairTracks(pair: Pair) {
  const isOneFile = pair.kick?.fileId === pair.overhead?.fileId;
  return pairRoles.map((role, i) => ({
    role,
    fileIndex: isOneFile ? 0 : i,
    channel: pair[role]?.channel ?? 0,
  }));
}
