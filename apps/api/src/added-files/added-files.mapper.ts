import { AddedFileResponse } from '@thudline/contracts';
import { Take } from '../takes/entities/take.entity';
import { AddedFile } from './entities/added-file.entity';

/** What an added file that is made holds; nothing where it isn't. */
export interface MadeFile {
  objectKey: string;
  sha256: string;
  bytes: number;
  frames: number;
  sampleRateHz: number;
  levelDb: number;
  truePeakDbtp: number | null;
  listenGainDb: number;
}

/** @returns null until it is made */
export function madeFileOf(added: AddedFile): MadeFile | null {
  const { objectKey, sha256, bytes, frames, sampleRateHz, levelDb, truePeakDbtp, listenGainDb } = added;
  if (added.state !== 'done' || objectKey == null || sha256 == null || bytes == null) return null;
  if (frames == null || sampleRateHz == null || levelDb == null || listenGainDb == null) return null;
  const levels = { levelDb, truePeakDbtp: truePeakDbtp ?? null, listenGainDb };
  return { objectKey, sha256, bytes, frames, sampleRateHz, ...levels };
}

export function addedFileResponseOf(added: AddedFile, take: Pick<Take, 'number'>): AddedFileResponse {
  const { id, createdAt, flipped, shiftMs, gainDb, state, progress, reason } = added;
  const made = madeFileOf(added);
  return {
    id,
    createdAt: createdAt.toISOString(),
    choice: { flipped, shiftMs, gainDb },
    state,
    progress,
    reason: reason ?? null,
    file: made && {
      name: addedFileName(added, take),
      bytes: made.bytes,
      sha256: made.sha256,
      durationS: made.frames / made.sampleRateHz,
      levelDb: made.levelDb,
      truePeakDbtp: made.truePeakDbtp,
      listenGainDb: made.listenGainDb,
    },
  };
}

type Choice = Pick<AddedFile, 'flipped' | 'shiftMs' | 'gainDb'>;

/** "take-14-added-flipped-1.6-ms-earlier-5.7-dB-louder.wav": what was chosen, in letters that every system takes. */
export function addedFileName(
  { flipped, shiftMs, gainDb }: Choice,
  { number }: Pick<Take, 'number'>,
): string {
  const amount = (value: number) => String(Number(Math.abs(value).toFixed(2)));
  const parts = [
    `take-${number}-added`,
    flipped && 'flipped',
    shiftMs !== 0 && `${amount(shiftMs)}-ms-${shiftMs > 0 ? 'earlier' : 'later'}`,
    gainDb !== 0 && `${amount(gainDb)}-dB-${gainDb > 0 ? 'louder' : 'quieter'}`,
  ];
  return `${parts.filter(Boolean).join('-')}.wav`;
}
