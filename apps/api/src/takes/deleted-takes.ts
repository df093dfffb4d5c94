/** "Undo of delete for 30 days": the product's promise. */
export const deletedKeptMs = 30 * 24 * 60 * 60 * 1000;

/** @returns the moment since which a take must have been deleted to be brought back */
export const restorableSince = (now = new Date()): Date => new Date(now.getTime() - deletedKeptMs);
