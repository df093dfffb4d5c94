import { thirdOctaves } from '../measurements/agreement/thirdOctaves';
import type { LengthUnit } from '../report/reportTypes';

/** One decimal in sentences (conventions), with the real minus sign. */
export function decimalText(value: number, digits = 1): string {
  const text = Math.abs(value).toFixed(digits);
  return value < 0 && Number(text) !== 0 ? `−${text}` : text;
}

/** Half-decibel steps for a preamp, without a sign: the words say up or down. At least 0.5, so that nothing is turned by 0. */
export function halfDbText(valueDb: number): string {
  return String(Math.max(0.5, Math.round(Math.abs(valueDb) * 2) / 2));
}

/** A level rounded to whole dB, with the real minus sign. */
export function wholeDbfsText(levelDbfs: number): string {
  return decimalText(levelDbfs, 0);
}

/** A difference in whole dB without a sign: the words say which way. */
export function wholeDbText(valueDb: number): string {
  return Math.abs(valueDb).toFixed(0);
}

/** A time without a sign, in whole milliseconds: the words say earlier or later. */
export function wholeMsText(ms: number): string {
  return `${Math.abs(ms).toFixed(0)} ms`;
}

const NUMBERS = 'no one two three four five six seven eight nine ten eleven twelve'.split(' ');

/** Small counts in words, larger ones in figures. */
export function countText(count: number): string {
  return NUMBERS[count] ?? String(count);
}

/** "one hit", "8 hits": the noun follows the count. */
export function counted(count: number, noun: string): string {
  return `${countText(count)} ${noun}${count === 1 ? '' : 's'}`;
}

export function capitalised(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}

const INCHES_IN_A_METRE = 39.3701;
const INCHES_IN_A_FOOT = 12;

/** A distance as one says it: 56 cm, 1.2 m, 1 ft 10 in. Never signed. */
export function lengthText(metres: number, unit: LengthUnit): string {
  const size = Math.abs(metres);
  if (unit === 'metre') return size < 0.995 ? `${Math.round(size * 100)} cm` : `${size.toFixed(1)} m`;
  const inches = Math.round(size * INCHES_IN_A_METRE);
  const feet = Math.floor(inches / INCHES_IN_A_FOOT);
  const rest = `${inches % INCHES_IN_A_FOOT} in`;
  return feet > 0 ? `${feet} ft ${rest}` : rest;
}

/** A third-octave by its nominal name: 80 Hz, 1.25 kHz. */
export function bandText(centreHz: number): string {
  const nearest = thirdOctaves.reduce((best, band) =>
    Math.abs(band.centreHz - centreHz) < Math.abs(best.centreHz - centreHz) ? band : best,
  );
  return nearest.nominal.endsWith('k') ? `${nearest.nominal.slice(0, -1)} kHz` : `${nearest.nominal} Hz`;
}
