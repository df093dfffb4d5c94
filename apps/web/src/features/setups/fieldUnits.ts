import type { UserSettings } from '@thudline/contracts';
import { parseNumber } from '../../components/InlineNumber';

type LengthUnit = UserSettings['lengthUnit'];

/** How a field's number is written, and what it is kept as. */
export interface FieldUnit {
  words: string;
  toShown: (kept: number) => number;
  toKept: (shown: number) => number;
}

const cmPerInch = 2.54;
const toTenth = (value: number) => Math.round(value * 10) / 10;
const toHundredth = (value: number) => Math.round(value * 100) / 100;
const asItIs = (words: string): FieldUnit => ({ words, toShown: toTenth, toKept: toTenth });

export const degree = asItIs('°');
export const decibel = asItIs('dB');
/** Kept in hundredths of a centimetre, so that tenths of an inch come back as they were written. */
const inch: FieldUnit = {
  words: 'in',
  toShown: (cm) => toTenth(cm / cmPerInch),
  toKept: (inches) => toHundredth(inches * cmPerInch),
};

/** Centimetres or inches, as the reader wants lengths. */
export const lengthUnitOf = (unit: LengthUnit): FieldUnit => (unit === 'foot' ? inch : asItIs('cm'));

export const shownText = (kept: number | null, unit: FieldUnit): string =>
  kept === null ? '' : String(unit.toShown(kept)).replace('-', '−');

/** @returns what was typed as it is kept; null for an empty field; undefined for what is no number */
export function keptNumber(text: string, unit: FieldUnit): number | null | undefined {
  if (text.trim() === '') return null;
  const shown = parseNumber(text);
  return shown === null ? undefined : unit.toKept(shown);
}
