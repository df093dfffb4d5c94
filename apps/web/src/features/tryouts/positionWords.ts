import type { TryOutPlaceResponse, TryOutUnit, UserSettings } from '@thudline/contracts';
import { number } from '../../lib/format';

export type Position = Pick<TryOutPlaceResponse, 'position' | 'label'>;
export type LengthUnit = UserSettings['lengthUnit'];

const cmPerInch = 2.54;

/** Positions are kept in centimetres, and told in the reader's unit. */
export const toShown = (position: number, unit: TryOutUnit, lengthUnit: LengthUnit): number =>
  unit === 'cm' && lengthUnit === 'foot' ? position / cmPerInch : position;

export const toKept = (shown: number, unit: TryOutUnit, lengthUnit: LengthUnit): number =>
  unit === 'cm' && lengthUnit === 'foot' ? shown * cmPerInch : shown;

/** "cm", "in", "°", "dB"; nothing for labels. */
export function unitWord(unit: TryOutUnit, lengthUnit: LengthUnit): string {
  const words = { cm: lengthUnit === 'foot' ? 'in' : 'cm', degree: '°', dB: 'dB', label: '' };
  return words[unit];
}

/** "100", "39.4", "felt beater"; null where nothing was written. */
export function shortPosition(place: Position, unit: TryOutUnit, lengthUnit: LengthUnit): string | null {
  if (unit === 'label') return place.label || null;
  if (place.position === null) return place.label || null;
  const shown = toShown(place.position, unit, lengthUnit);
  return number(shown, Math.abs(shown - Math.round(shown)) < 0.05 ? 0 : 1);
}

/** "100 cm", "45°", "felt beater". */
export function positionWords(place: Position, unit: TryOutUnit, lengthUnit: LengthUnit): string | null {
  const short = shortPosition(place, unit, lengthUnit);
  if (short === null || unit === 'label' || place.position === null) return short;
  return unit === 'degree' ? `${short}°` : `${short} ${unitWord(unit, lengthUnit)}`;
}
