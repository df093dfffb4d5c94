import type { TryOutUnit } from '@thudline/contracts';
import { toKept, toShown, type LengthUnit, type Position } from './positionWords';

const typedNumber = (text: string) => Number(text.trim().replace(',', '.').replace('\u2212', '-'));

/** As it stands in a field, in the reader's unit. */
export function positionText(
  { position, label }: Position,
  unit: TryOutUnit,
  lengthUnit: LengthUnit,
): string {
  if (unit === 'label' || position === null) return label;
  return String(Number(toShown(position, unit, lengthUnit).toFixed(1)));
}

/** What was written in a field; null where it is no number and should be one. */
export function typedPosition(text: string, unit: TryOutUnit, lengthUnit: LengthUnit): Position | null {
  const written = text.trim();
  if (unit === 'label' || written === '') return { position: null, label: written };
  const typed = typedNumber(written);
  return Number.isFinite(typed) ? { position: toKept(typed, unit, lengthUnit), label: '' } : null;
}
