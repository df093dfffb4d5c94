import { useState } from 'react';
import { keptNumber, shownText, type FieldUnit } from '../fieldUnits';

/** What is being typed into a field for a number; what is no number is not taken. */
export function useTypedNumber(
  value: number | null,
  unit: FieldUnit,
  onChange: (value: number | null) => void,
) {
  const [typed, setTyped] = useState<string | null>(null);
  const isNumber = typed === null || keptNumber(typed, unit) !== undefined;
  return {
    text: typed ?? shownText(value, unit),
    isNumber,
    type: (text: string) => {
      setTyped(text);
      const kept = keptNumber(text, unit);
      if (kept !== undefined) onChange(kept);
    },
    /** What was typed is shown as it is kept; what is no number stays, with the word that it is none. */
    leave: () => {
      if (isNumber) setTyped(null);
    },
  };
}
