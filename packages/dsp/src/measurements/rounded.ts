/** Lists of what each hit says are kept with every report: a ten-thousandth is far finer than any of them is known. */
export function rounded(value: number): number {
  return Math.round(value * 1e4) / 1e4;
}
