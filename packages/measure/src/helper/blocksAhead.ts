/** How many blocks the helper's pass may be ahead of the other: enough that neither waits for the other's disk. */
export const blocksAhead = 16;
