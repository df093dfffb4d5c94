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
}

/** What somebody typed as a number: a comma or a real minus sign is as good as what a program writes. */
export function parseNumber(text: string): number | null {
  const plain = text.trim().replace(',', '.').replace('−', '-').replace(/^\+/, '');
  return /^-?(\d+\.?\d*|\.\d+)$/.test(plain) ? Number(plain) : null;
}

/** A number inside a sentence that can be typed over; the arrow keys step it. What is not a number is left alone. */
export function InlineNumber({ label, value, digits, step, min, max, onChange }: InlineNumberProps) {
  const [typed, setTyped] = useState<string | null>(null);
  const shown = typed ?? number(value, digits);
  const offer = (next: number) => onChange(Math.min(max, Math.max(min, next)));
  return (
    <chakra.input
      aria-label={label}
      inputMode="decimal"
      role="spinbutton"
      aria-valuenow={Number(value.toFixed(digits))}
      aria-valuemin={min}
      aria-valuemax={max}
      aria-invalid={typed !== null && parseNumber(typed) === null ? true : undefined}
      value={shown}
      width={`${Math.max(3, shown.length) + 1}ch`}
      height="28px"
      lineHeight="26px"
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
        const parsed = parseNumber(event.target.value);
        if (parsed !== null) offer(parsed);
      }}
      onBlur={() => setTyped(null)}
      onKeyDown={(event) => {
        const way = event.key === 'ArrowUp' ? 1 : event.key === 'ArrowDown' ? -1 : 0;
        if (way === 0) return;
        event.preventDefault();
        setTyped(null);
        offer(Number((value + way * step).toFixed(digits)));
      }}
    />
  );
}
