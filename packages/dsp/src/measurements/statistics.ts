/**
 * Quantile by linear interpolation between order statistics (type 7 of Hyndman & Fan 1996, NumPy's default).
 *
 * @param share - 0–1
 * @returns null for an empty list
 */
export function quantile(values: readonly number[], share: number): number | null {
  if (values.length === 0) return null;
  const sorted = [...values].sort((a, b) => a - b);
  const position = (sorted.length - 1) * share;
  const below = Math.floor(position);
  const above = Math.min(sorted.length - 1, below + 1);
  return sorted[below] + (sorted[above] - sorted[below]) * (position - below);
}

/** @returns the middle value, the mean of the two middle ones for an even count, null for none */
export function median(values: readonly number[]): number | null {
  return quantile(values, 0.5);
}

/** Distance between the quartiles (type 7). @returns null for fewer than two values */
export function interquartileRange(values: readonly number[]): number | null {
  const lower = quantile(values, 0.25);
  const upper = quantile(values, 0.75);
  return values.length < 2 || lower === null || upper === null ? null : upper - lower;
}
