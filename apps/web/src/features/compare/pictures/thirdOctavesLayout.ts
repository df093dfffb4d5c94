import { thirdOctaveLevels, type PairSpectrum } from '@thudline/dsp';

export interface BandPair {
  nominal: string;
  centreHz: number;
  /** Of the two added against their power sum; null where there is nothing to add up. */
  beforeDb: number | null;
  afterDb: number | null;
}

export interface ComparedSpectrum {
  spectrum: PairSpectrum;
  /** How much louder the overhead is played against the kick. */
  overheadGainDb: number;
}

/** The most two can give is 3.01 dB; as far below, a half is lost. */
export const limitDb = 3.0103;

/** Third-octaves of both takes as recorded, levels matched. */
export function bandPairs(before: ComparedSpectrum, after: ComparedSpectrum): BandPair[] {
  const levels = ({ spectrum, overheadGainDb }: ComparedSpectrum) =>
    thirdOctaveLevels(spectrum, { flipped: false, shiftMs: 0, gainDb: overheadGainDb });
  const to = levels(after);
  return levels(before).map((band, i) => ({
    nominal: band.nominal,
    centreHz: band.centreHz,
    beforeDb: band.levelDb,
    afterDb: to[i].levelDb,
  }));
}

/** A line through the bands' middles, broken where a band holds nothing. */
export function bandPath(
  levelsDb: readonly (number | null)[],
  { x, y }: { x: (band: number) => number; y: (db: number) => number },
): string {
  let path = '';
  let broken = true;
  levelsDb.forEach((db, i) => {
    if (db !== null) path += `${broken ? 'M' : 'L'}${x(i).toFixed(1)} ${y(db).toFixed(1)}`;
    broken = db === null;
  });
  return path;
}

/** The band that moved most, for the text alternative. */
export function largestMove(bands: readonly BandPair[]): { nominal: string; byDb: number } | null {
  const moves = bands.flatMap(({ nominal, beforeDb, afterDb }) =>
    beforeDb === null || afterDb === null ? [] : [{ nominal, byDb: afterDb - beforeDb }],
  );
  return moves.reduce<(typeof moves)[number] | null>(
    (top, move) => (top === null || Math.abs(move.byDb) > Math.abs(top.byDb) ? move : top),
    null,
  );
}
