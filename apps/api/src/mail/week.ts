const dayMs = 24 * 60 * 60 * 1000;
export const weekMs = 7 * dayMs;

/** Monday 6:00 UTC, the 5th of January 1970: read with the first coffee, wherever one lives near. */
const firstMs = 4 * dayMs + 6 * 60 * 60 * 1000;

/** @returns the last end of a week at or before `now` */
export const weekEnd = (now: Date): Date =>
  new Date(firstMs + Math.floor((now.getTime() - firstMs) / weekMs) * weekMs);
