/** A cell that begins like a formula would be run as one by a spreadsheet; a number is left alone. */
function cell(text: string): string {
  const safe = /^[=+\-@\t\r]/.test(text) && !/^[+-]?[\d.]+$/.test(text) ? `'${text}` : text;
  return /[",\n]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
}

/** One line of comma-separated values, without its end. */
export const csvRow = (cells: readonly string[]): string => cells.map(cell).join(',');
