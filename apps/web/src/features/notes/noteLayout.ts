export interface PlacedNote {
  /** Where what it speaks of stands, from the top of the margin. */
  anchorPx: number;
  heightPx: number;
}

/**
 * Notes in a margin, each beside what it speaks of; where two would overlap the lower one gives way.
 *
 * @param notes - from top to bottom
 * @returns their tops, from the top of the margin
 */
export function noteTopsPx(notes: readonly PlacedNote[], gapPx: number): number[] {
  let freePx = 0;
  return notes.map(({ anchorPx, heightPx }) => {
    const topPx = Math.max(0, anchorPx, freePx);
    freePx = topPx + heightPx + gapPx;
    return topPx;
  });
}

/** A hairline from the margin line to a note: level where the note stands at its place, bent where it gave way. */
export function hairlinePath({ widthPx, fallPx }: { widthPx: number; fallPx: number }): string {
  if (Math.abs(fallPx) < 1) return `M0 0H${widthPx}`;
  return `M0 ${-fallPx}H${widthPx * 0.3}L${widthPx * 0.7} 0H${widthPx}`;
}

export interface PlacedPin {
  /** From the left edge of the take. */
  xPx: number;
  row: number;
}

/**
 * Letters below the axis of the whole take: those too near to each other to be touched apart go down a row.
 *
 * @param xsPx - from left to right
 */
export function pinRows(xsPx: readonly number[], apartPx: number): PlacedPin[] {
  const lastInRow: number[] = [];
  return xsPx.map((xPx) => {
    const free = lastInRow.findIndex((last) => xPx - last >= apartPx);
    const row = free === -1 ? lastInRow.length : free;
    lastInRow[row] = xPx;
    return { xPx, row };
  });
}
