import type { TryOutRankingRow, TryOutResponse } from '@thudline/contracts';

/** A take as it is heard: from its first kick hit, with the polarity its figure is told with. */
export interface HeardPlace {
  placeId: string;
  takeId: string;
  flipped: boolean;
  overheadGainDb: number;
  /** The common beginning. */
  startS: number;
  /** All are heard for the same time, so that they begin again together. */
  endS: number;
}

/** Before the first kick hit, so that its attack is whole. */
const beforeS = 0.15;
/** Enough bars to hear a difference; all takes are held in memory, so that switching is exact. */
const heardS = 20;

/** The measured takes of a try-out, in the order they were played. */
export function heardPlaces(tryOut: TryOutResponse, rows: readonly TryOutRankingRow[]): HeardPlace[] {
  const heard = tryOut.places.flatMap(({ id, take }) => {
    const row = rows.find(({ placeId }) => placeId === id);
    return take && row ? [{ placeId: id, takeId: take.id, row }] : [];
  });
  const leadS = Math.min(beforeS, ...heard.map(({ row }) => row.heard.firstKickS));
  const lengthS = Math.min(
    heardS,
    ...heard.map(({ row: { heard: of } }) => of.durationS - of.firstKickS + leadS),
  );
  return heard.map(({ row, ...place }) => {
    const { firstKickS, overheadGainDb } = row.heard;
    const startS = firstKickS - leadS;
    return { ...place, flipped: row.flipped, overheadGainDb, startS, endS: startS + lengthS };
  });
}

/** An order in which nobody knows what stands where; the numbers come from 0 (inclusive) to 1 (exclusive). */
export function shuffled<T>(items: readonly T[], random: () => number): T[] {
  const mixed = [...items];
  for (let i = mixed.length - 1; i > 0; i--) {
    const other = Math.floor(random() * (i + 1));
    [mixed[i], mixed[other]] = [mixed[other], mixed[i]];
  }
  return mixed;
}
