import type { Choice, PairSpectrum } from '../../facts';
import { bandEnergies, lowEnd, ratioDb, type Band } from './choiceEnergy';
import { thirdOctaves, zones, type ZoneName } from './thirdOctaves';

export interface ThirdOctaveLevel {
  readonly centreHz: number;
  readonly nominal: string;
  /** Against the power sum, −100 … +3.01 dB; null where neither microphone has anything in the band. */
  readonly levelDb: number | null;
}

export interface ZoneLevel {
  readonly name: ZoneName;
  readonly lowHz: number;
  readonly highHz: number;
  /** As for third-octaves. */
  readonly levelDb: number | null;
}

/** The band by which choices of one take are matched for listening, so that the low-end change stays audible. */
const LISTENING_BAND: Band = { lowHz: 1000, highHz: 8000 };
/** Named dips are looked for here: below, a bin is half a band; above, a dip is only the room. */
const DIPS_FROM_HZ = 30;
const DIPS_TO_HZ = 900;

/**
 * Low end of the two added with a choice, against their power sum.
 *
 * @param band - 30–150 Hz unless told otherwise
 * @returns dB, at most +3.01; null where neither microphone has anything in the band
 * @example
 * choiceLowEnd(spectrum, { flipped: true, shiftMs: 2, gainDb: 7.96 }) // 3.01
 */
export function choiceLowEnd(spectrum: PairSpectrum, choice: Choice, band: Band = lowEnd): number | null {
  const { added, powerSum } = bandEnergies(spectrum, choice, band);
  return ratioDb(added, powerSum);
}

/**
 * The two added with a choice, against their power sum, by third-octaves from 25 Hz to 10 kHz (IEC 61260-1).
 * @example
 * const levels = thirdOctaveLevels(spectrum, { flipped: true, shiftMs: 2, gainDb: 7.96 });
 * levels.length // 27
 */
export function thirdOctaveLevels(spectrum: PairSpectrum, choice: Choice): ThirdOctaveLevel[] {
  return thirdOctaves.map((band) => ({
    centreHz: band.centreHz,
    nominal: band.nominal,
    levelDb: choiceLowEnd(spectrum, choice, band),
  }));
}

/**
 * The two added with a choice, against their power sum, in the five zones of "where it helps".
 * @example
 * const [deep, thump] = zoneLevels(spectrum, { flipped: false, shiftMs: 0, gainDb: 7.96 });
 * thump.levelDb // -5.245
 */
export function zoneLevels(spectrum: PairSpectrum, choice: Choice): ZoneLevel[] {
  return zones.map((zone) => ({ ...zone, levelDb: choiceLowEnd(spectrum, choice, zone) }));
}

/**
 * The third-octave from 31.5 to 800 Hz that loses most. @returns null for a silent pair
 * @example
 * deepestThirdOctave(spectrum, { flipped: false, shiftMs: 0, gainDb: 7.96 }).levelDb // -10.919
 */
export function deepestThirdOctave(
  spectrum: PairSpectrum,
  choice: Choice,
): { centreHz: number; levelDb: number } | null {
  let deepest: { centreHz: number; levelDb: number } | null = null;
  for (const { centreHz, levelDb } of thirdOctaveLevels(spectrum, choice)) {
    if (levelDb === null || centreHz < DIPS_FROM_HZ || centreHz > DIPS_TO_HZ) continue;
    if (!deepest || levelDb < deepest.levelDb) deepest = { centreHz, levelDb };
  }
  return deepest;
}

/**
 * How much louder one choice is than another from 1 to 8 kHz. Turn the louder one down by it and both play alike but for
 * the low end.
 *
 * @returns dB, positive where `choiceA` is louder; 0 where there is nothing to match by
 * @example
 * const [recorded, flipped] = [false, true].map((flipped) => ({ flipped, shiftMs: 0, gainDb: 0 }));
 * listeningMatchDb(spectrum, recorded, flipped) // -0.39
 */
export function listeningMatchDb(spectrum: PairSpectrum, choiceA: Choice, choiceB: Choice): number {
  const a = bandEnergies(spectrum, choiceA, LISTENING_BAND);
  const b = bandEnergies(spectrum, choiceB, LISTENING_BAND);
  return ratioDb(a.added, b.added) ?? 0;
}

/**
 * What flipping the overhead does to the energy of a band: 10·lg(ΣE(s = −1) ÷ ΣE(s = +1)).
 *
 * @returns dB, positive where flipping gains; null for a silent pair
 * @example
 * flipGain(spectrum, { gainDb: 7.96 }) // 7.859
 */
export function flipGain(
  spectrum: PairSpectrum,
  { gainDb, shiftMs = 0, lowHz = lowEnd.lowHz, highHz = lowEnd.highHz }: FlipGainOptions,
): number | null {
  const band = { lowHz, highHz };
  const flipped = bandEnergies(spectrum, { flipped: true, gainDb, shiftMs }, band);
  const kept = bandEnergies(spectrum, { flipped: false, gainDb, shiftMs }, band);
  return ratioDb(flipped.added, kept.added);
}

export interface FlipGainOptions extends Partial<Band> {
  readonly gainDb: number;
  readonly shiftMs?: number;
}
