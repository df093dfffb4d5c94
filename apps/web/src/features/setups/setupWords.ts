import type { SetupFields, SetupListItem, SetupResponse, UserSettings } from '@thudline/contracts';
import { pathDifferenceM } from '@thudline/dsp';
import { milliseconds, number, plural } from '../../lib/format';
import { takeNumbers } from '../takes/chosenTakes';
import { everyTake, takesAddress } from '../takes/takesQuery';
import { setupDistances } from './setupGeometry';

type Measured = SetupResponse['measured'];
type Reader = Pick<UserSettings, 'lengthUnit' | 'temperatureC'>;

/** An arrival holds to about 0.3 ms, a tape on a kit to some centimetres; beyond this, one of them is wrong. */
const agreeWithinCm = 12;

/** A tape reads in whole centimetres or inches, also beyond a metre or a foot. */
export const tapeWords = (lengthCm: number, lengthUnit: Reader['lengthUnit']): string =>
  lengthUnit === 'foot' ? `${number(lengthCm / 2.54, 0)} in` : `${number(lengthCm, 0)} cm`;

const cm = (lengthCm: number, { lengthUnit }: Reader) => tapeWords(lengthCm, lengthUnit);

export const measuredCm = (measured: NonNullable<Measured>, { temperatureC }: Reader): number =>
  100 * pathDifferenceM(measured.arrivalMs, temperatureC);

/** What the headline says after the setup's name. */
export function agreementWords(
  fields: Pick<SetupFields, 'kick' | 'overhead'>,
  measured: Measured,
  reader: Reader,
): string {
  const { differenceCm } = setupDistances(fields);
  if (differenceCm === null)
    return measured
      ? `Take ${measured.number} is measured; the tape isn’t yet.`
      : 'Write down what you measured with a tape.';
  if (!measured) return 'No take has been measured with it yet.';
  const apartCm = Math.abs(differenceCm - measuredCm(measured, reader));
  if (apartCm > agreeWithinCm) return `The tape and the sound are ${cm(apartCm, reader)} apart.`;
  const within = reader.lengthUnit === 'foot' ? Math.max(2.54, apartCm) : Math.max(1, apartCm);
  return `The tape and the sound agree within ${cm(within, reader)}.`;
}

/** Why the two may differ, where they do. */
export function apartWords(
  fields: Pick<SetupFields, 'kick' | 'overhead'>,
  measured: Measured,
  reader: Reader,
): string {
  const { differenceCm } = setupDistances(fields);
  if (differenceCm === null || !measured) return '';
  if (Math.abs(differenceCm - measuredCm(measured, reader)) <= agreeWithinCm) return '';
  return 'A microphone was moved, a number is off, or your kit is another size than the one drawn here.';
}

export const measuredWords = (measured: NonNullable<Measured>, reader: Reader): string =>
  `take ${measured.number} measured ${cm(measuredCm(measured, reader), reader)}, ${milliseconds(measured.arrivalMs)}`;

export function numbersWords(differenceCm: number, reader: Reader): string {
  const msPerCm = 1 / (100 * pathDifferenceM(1, reader.temperatureC));
  return `the numbers say ${cm(differenceCm, reader)}, ${milliseconds(differenceCm * msPerCm)}`;
}

/** Both views in a sentence. */
export function pictureWords(fields: Pick<SetupFields, 'kick' | 'overhead'>, reader: Reader): string {
  const { beaterToKickCm, beaterToOverheadCm } = setupDistances(fields);
  const told = (name: string, lengthCm: number | null) =>
    lengthCm === null ? `${name} not drawn as a whole` : `${name} ${cm(lengthCm, reader)}`;
  return `From where the beater strikes: ${told('kick microphone', beaterToKickCm)}; ${told('overhead', beaterToOverheadCm)}.`;
}

const fieldNames = [
  ['kick', 'insideCm', 'inside the front hole'],
  ['kick', 'offCentreCm', 'off the centre'],
  ['kick', 'heightCm', 'height'],
  ['overhead', 'aboveSnareCm', 'above the snare'],
  ['overhead', 'towardKickCm', 'toward the kick'],
  ['overhead', 'awayFromHatCm', 'away from the hat'],
] as const;

/** "For the distance, still empty: height, toward the kick." */
export function missingWords({ kick, overhead }: Pick<SetupFields, 'kick' | 'overhead'>): string {
  const values: Record<string, number | null | string> = { ...kick, ...overhead };
  const empty = fieldNames.filter(([, field]) => values[field] === null).map(([, , name]) => name);
  return empty.length === 0 ? '' : `For the distance, still empty: ${empty.join(', ')}.`;
}

/** "used by take 17", "used by takes 12, 14 and 3 more". */
export function usedWords({ takes, takeCount }: Pick<SetupResponse, 'takes' | 'takeCount'>): string {
  if (takeCount === 0) return 'no take has it yet';
  if (takeCount <= takes.length) return `used by ${takeNumbers(takes)}`;
  const shown = takes.slice(0, 3);
  const numbers = shown.map(({ number }) => number).sort((a, b) => a - b);
  return `used by takes ${numbers.join(', ')} and ${takeCount - shown.length} more`;
}

function depthWords(insideCm: number, reader: Reader): string {
  if (insideCm === 0) return 'in the hole';
  return insideCm < 0 ? `${cm(-insideCm, reader)} in front of the hole` : `${cm(insideCm, reader)} inside`;
}

/** "kick 8 cm inside, overhead 90 cm above the snare". */
export function placesWords({ kick, overhead }: SetupListItem, reader: Reader): string {
  const parts: string[] = [];
  if (kick.insideCm !== null) parts.push(`kick ${depthWords(kick.insideCm, reader)}`);
  if (overhead.aboveSnareCm !== null)
    parts.push(`overhead ${cm(overhead.aboveSnareCm, reader)} above the snare`);
  return parts.join(', ') || 'no places written down';
}

/** The takes recorded with a setup. */
export const takesOfSetup = (setupId: string): string => takesAddress({ ...everyTake, setup: setupId });

export const takesWords = (takeCount: number): string =>
  takeCount === 0 ? 'no take yet' : plural(takeCount, 'take');
