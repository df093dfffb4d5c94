export type Cell = string | number | boolean | null | Date;

/** A cell that begins like a formula would be run as one by a spreadsheet. */
function cell(value: Cell): string {
  if (value === null) return '';
  if (value instanceof Date) return value.toISOString();
  if (typeof value !== 'string') return String(value);
  const safe = /^[=+\-@\t\r]/.test(value) ? `'${value}` : value;
  return /[",\n\r]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
}

/** Rows as comma-separated values (RFC 4180), names first. */
export const csvOf = (head: readonly string[], rows: readonly (readonly Cell[])[]): string =>
  [head, ...rows].map((row) => `${row.map(cell).join(',')}\r\n`).join('');
