/** What was chosen last in this browser: evenings go on with what stands there. */
export interface LastChosen {
  read: () => string | null;
  write: (id: string) => void;
}

/** A browser may refuse to keep anything: then the next take begins without. */
export const lastChosen = (storageKey: string): LastChosen => ({
  read: () => {
    try {
      return localStorage.getItem(storageKey);
    } catch {
      return null;
    }
  },
  write: (id) => {
    try {
      localStorage.setItem(storageKey, id);
    } catch {
      return;
    }
  },
});

/**
 * What is chosen among those there are: one that is not there any more is none.
 *
 * @param here - what was chosen on this page: an id, empty for none, null for nothing yet
 * @param beforeId - what evenings go on with
 */
export const chosenAmong = (
  those: readonly { id: string }[],
  here: string | null,
  beforeId: string | null,
): string | null => those.find(({ id }) => id === (here ?? beforeId))?.id ?? null;
