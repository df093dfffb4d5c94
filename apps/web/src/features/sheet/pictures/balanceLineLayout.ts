/** From here on cymbals are louder than any fader mends later; common practice, no source. */
export const cymbalsLoudFromDb = 3;

/** The axis is counted from the drums, and goes beyond these ends, in steps of 6 dB, only where it must. */
export function balanceAxisDb(differenceDb: number): { min: number; max: number } {
  return {
    min: Math.min(-12, Math.floor(differenceDb / 6) * 6),
    max: Math.max(6, Math.ceil(differenceDb / 6) * 6),
  };
}

/** Every 6 dB, or every 12 where those would crowd. */
export function balanceTicksDb({ min, max }: { min: number; max: number }, widthPx: number): number[] {
  const stepDb = ((max - min) / 6) * 54 > widthPx ? 12 : 6;
  const first = Math.ceil(min / stepDb) * stepDb;
  return Array.from({ length: Math.floor((max - first) / stepDb) + 1 }, (_, i) => first + i * stepDb);
}
