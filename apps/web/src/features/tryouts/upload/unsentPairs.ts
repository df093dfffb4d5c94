import type { TryOutPlaceResponse, TryOutResponse } from '@thudline/contracts';
import { isReady, type PickedFile, type ReadyFile } from '../../upload/pickedFile';
import { recordedAt } from '../../upload/recordedAt';
import { positionWords, type LengthUnit } from '../positionWords';
import { subjectWords } from '../subjectWords';
import { groupFiles, pairFile } from './pairs';
import type { PairToSend } from './sendQueue';
import { pairTracks, recordedFile } from './tryOutRequest';

/** Places whose files never arrived. */
export const unsentPlaces = ({ places }: Pick<TryOutResponse, 'places'>): TryOutPlaceResponse[] =>
  places.filter(({ take }) => take === null);

/**
 * Files that were dropped again find their places by name. They travel with the keys of the first time, so that a take
 * whose answer was lost is not kept twice.
 *
 * @returns the pairs that are whole, and the names that fit nowhere
 */
export function pairsToSendAgain(
  tryOut: TryOutResponse,
  files: readonly PickedFile[],
  { lengthUnit, nowMs }: { lengthUnit: LengthUnit; nowMs: number },
): { pairs: PairToSend[]; strangers: string[] } {
  const ready = files.filter(isReady);
  const used = new Set<string>();
  const pairs = unsentPlaces(tryOut).flatMap((place) => {
    const own = place.fileNames.map((name) => ready.find(({ file }) => file.name === name));
    const found = own.filter((picked) => picked !== undefined);
    if (own.length === 0 || found.length < own.length) return [];
    found.forEach(({ id }) => used.add(id));
    const sent = found.map(({ file }) => file);
    const where = positionWords(place, tryOut.unit, lengthUnit);
    const { column } = subjectWords(tryOut);
    return {
      files: sent,
      request: {
        uploadKey: place.uploadKey,
        title: where === null ? '' : tryOut.unit === 'label' ? where : `${column} ${where}`,
        note: '',
        recordedAt: recordedAt(found.map(recordedFile), nowMs),
        doneActions: [],
        tags: [],
        tracks: tracksOf(found),
      },
    };
  });
  return { pairs, strangers: ready.filter(({ id }) => !used.has(id)).map(({ file }) => file.name) };
}

/** Two files are kept kick first; of one the sides are guessed, as they were before. */
function tracksOf([first, second]: readonly ReadyFile[]) {
  if (second)
    return pairTracks({
      key: '',
      kick: { fileId: first.id, channel: 0 },
      overhead: { fileId: second.id, channel: 0 },
    });
  return pairTracks(groupFiles([pairFile(first)])[0]);
}
