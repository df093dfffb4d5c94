import { TextField } from '../../../components/TextField';

/** A number that may be left empty; what can't be read is kept as it was typed and told as NaN. */
export function NumberField({
  label,
  text,
  onChange,
}: {
  label: string;
  text: string;
  onChange: (text: string) => void;
}) {
  const wrong = Number.isNaN(numberOf(text) ?? 0);
  return (
    <TextField
      label={label}
      inputMode="decimal"
      value={text}
      onChange={onChange}
      error={wrong ? 'Write a number, or nothing.' : undefined}
    />
  );
}

/** @returns null for nothing, NaN for what is no number; a comma is a decimal point, too */
export function numberOf(text: string): number | null {
  const plain = text.trim().replace(',', '.');
  return plain === '' ? null : Number(plain);
}
