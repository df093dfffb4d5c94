/** Levels, times in ms and lengths carry their unit last; 0.0001 of it is finer than any of them is known. */
const coarseUnits = /(Db|Dbfs|Ms|M|Hz)$/;

/**
 * A copy with every number rounded for printing: 4 decimals for levels, milliseconds and metres, 6 for everything else.
 *
 * @param value - anything JSON can hold
 */
export function roundedNumbers<Value>(value: Value, key = ''): Value {
  if (typeof value === 'number') return rounded(value, coarseUnits.test(key) ? 4 : 6) as Value;
  if (Array.isArray(value)) return value.map((item: unknown) => roundedNumbers(item, key)) as Value;
  if (typeof value !== 'object' || value === null) return value;
  return Object.fromEntries(
    Object.entries(value).map(([name, item]) => [name, roundedNumbers<unknown>(item, name)]),
  ) as Value;
}

/** Without a negative zero, which JSON would hide and a reader wonder at. */
function rounded(value: number, decimals: number): number {
  return Number(value.toFixed(decimals)) + 0;
}
