import { chakra } from '@chakra-ui/react';
import { useState } from 'react';
import { number } from '../lib/format';

interface InlineNumberProps {
  label: string;
  value: number;
  digits: number;
  step: number;
  min: number;
  max: number;
  onChange: (value: number) => void;
  /** Stands behind the number, over the same line. */
  unit?: string;
  /** Offers what is typed when the field is left or Enter is pressed, not with every letter. */
  whenLeft?: boolean;
  /** How typed text is read; null where it is no number. */
  read?: (text: string) => number | null;
  /** The field was left with something that is no number. */
  onRefused?: () => void;
}

/** What somebody typed as a number: a comma, a real minus sign or a unit behind it does no harm. */
export function parseNumber(text: string): number | null {
  const plain = text
    .trim()
    .replace(',', '.')
    .replace('−', '-')
    .replace(/^\+/, '')
    .replace(/\s*[a-z°]+$/i, '');
  return /^-?(\d+\.?\d*|\.\d+)$/.test(plain) ? Number(plain) : null;
}

/** A number inside a sentence that can be typed over; the arrow keys step it. What is not a number is left alone. */
export function InlineNumber({
  label,
  value,
  digits,
  step,
  min,
  max,
  onChange,
  unit,
  whenLeft = false,
  read = parseNumber,
  onRefused,
}: InlineNumberProps) {
  const [typed, setTyped] = useState<string | null>(null);
  const shown = typed ?? number(value, digits) + (unit ? ` ${unit}` : '');
  const offer = (next: number) => onChange(Math.min(max, Math.max(min, next)));
  const leave = () => {
    const parsed = typed === null ? null : read(typed);
    if (whenLeft && parsed !== null) offer(parsed);
    if (typed !== null && parsed === null) onRefused?.();
    setTyped(null);
  };
  return (
    <chakra.input
      aria-label={label}
      inputMode="decimal"
      role="spinbutton"
      aria-valuenow={Number(value.toFixed(digits))}
      aria-valuetext={unit && `${number(value, digits)} ${unit}`}
      aria-valuemin={min}
      aria-valuemax={max}
      aria-invalid={typed !== null && read(typed) === null ? true : undefined}
      value={shown}
      width={`calc(${Math.max(2, shown.length)}ch + 10px)`}
      minHeight="29px"
      lineHeight="24px"
      marginX="2px"
      textAlign="center"
      bg="transparent"
      color="ink"
      fontWeight={600}
      borderRadius="0"
      borderBottom="2px solid"
      borderColor="edge"
      _invalid={{ borderColor: 'fix' }}
      onChange={(event) => {
        setTyped(event.target.value);
        const parsed = read(event.target.value);
        if (!whenLeft && parsed !== null) offer(parsed);
      }}
      onBlur={leave}
      onKeyDown={(event) => {
        if (event.key === 'Enter') leave();
        const way = event.key === 'ArrowUp' ? 1 : event.key === 'ArrowDown' ? -1 : 0;
        if (way === 0) return;
        event.preventDefault();
        setTyped(null);
        offer(Number((value + way * step).toFixed(4)));
      }}
    />
  );
}
