import { assertBetween, assertPositive } from '../../assert';

/** One part of what encloses a room. */
export interface AbsorbingArea {
  readonly areaM2: number;
  /** 0 throws everything back, 1 nothing; laboratories print up to 1.2, which counts as 1. */
  readonly absorption: number;
}

export interface ReverberationOptions {
  readonly volumeM3: number;
  readonly areas: readonly AbsorbingArea[];
  readonly speedOfSoundMPerS: number;
}

/** What laboratories print at most: edges of a sample swallow sound too; from memory. */
const HIGHEST_PRINTED = 1.5;

/**
 * Sabine's reverberation time, T = 24·ln 10·V / (c·Σ Sα).
 *
 * Air absorption is left out: in small rooms below 4 kHz it is nothing.
 *
 * @returns seconds per 60 dB; null where nothing absorbs
 * @throws {SignalError} `option` for a volume, speed or area that is not above 0, or an absorption outside 0–1.5
 * @see W. C. Sabine; the constant as in Everest, The Master Handbook of Acoustics, 4th ed., chapter 7 (0.049 in feet)
 * @example
 * sabineS({ volumeM3: 50, areas: [{ areaM2: 80, absorption: 0.2 }], speedOfSoundMPerS: 343 }) // 0.503
 */
export function sabineS(options: ReverberationOptions): number | null {
  assertOptions(options);
  return seconds(options, absorptionArea(options.areas));
}

/**
 * Norris and Eyring's reverberation time, T = 24·ln 10·V / (−c·S·ln(1 − ᾱ)): nearer than Sabine's in a dry room.
 *
 * @returns seconds per 60 dB; 0 where everything absorbs, null where nothing does
 * @throws {SignalError} as {@link sabineS}
 * @see C. F. Eyring, "Reverberation time in 'dead' rooms", JASA 1 (1930) (from memory)
 * @example
 * eyringS({ volumeM3: 50, areas: [{ areaM2: 80, absorption: 0.2 }], speedOfSoundMPerS: 343 }) // 0.451
 */
export function eyringS(options: ReverberationOptions): number | null {
  assertOptions(options);
  const total = options.areas.reduce((sum, { areaM2 }) => sum + areaM2, 0);
  const mean = Math.min(1, absorptionArea(options.areas) / total);
  return seconds(options, -total * Math.log(1 - mean));
}

/**
 * @returns square metres that swallow everything, for what the areas swallow: metric sabins
 * @example
 * absorptionArea([{ areaM2: 10, absorption: 0.5 }, { areaM2: 20, absorption: 1.15 }]) // 25
 */
export function absorptionArea(areas: readonly AbsorbingArea[]): number {
  return areas.reduce((sum, { areaM2, absorption }) => sum + areaM2 * Math.min(1, absorption), 0);
}

function seconds({ volumeM3, speedOfSoundMPerS }: ReverberationOptions, area: number): number | null {
  return area > 0 ? (24 * Math.LN10 * volumeM3) / (speedOfSoundMPerS * area) : null;
}

function assertOptions({ volumeM3, areas, speedOfSoundMPerS }: ReverberationOptions): void {
  assertPositive(volumeM3, 'volumeM3');
  assertPositive(speedOfSoundMPerS, 'speedOfSoundMPerS');
  assertPositive(areas.length, 'areas.length');
  for (const { areaM2, absorption } of areas) {
    assertPositive(areaM2, 'areaM2');
    assertBetween(absorption, 0, HIGHEST_PRINTED, 'absorption');
  }
}
