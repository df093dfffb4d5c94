/** A straight line, y = intercept + slope · x. */
export interface Line {
  readonly slope: number;
  readonly intercept: number;
}

/**
 * Least-squares line through `values[from] … values[to − 1]`, whose x is the index.
 *
 * @returns null for fewer than three values
 */
export function fitLine(values: Float64Array, from: number, to: number): Line | null {
  const count = to - from;
  if (count < 3) return null;
  const meanX = (from + to - 1) / 2;
  let meanY = 0;
  for (let i = from; i < to; i += 1) meanY += values[i] / count;
  let over = 0;
  let under = 0;
  for (let i = from; i < to; i += 1) {
    over += (i - meanX) * (values[i] - meanY);
    under += (i - meanX) ** 2;
  }
  const slope = over / under;
  return { slope, intercept: meanY - slope * meanX };
}
