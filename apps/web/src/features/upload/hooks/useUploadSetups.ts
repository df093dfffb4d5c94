import type { SetupListItem } from '@thudline/contracts';
import { useSetups } from '../../setups/hooks/useSetups';

const storageKey = 'thudline.setup';

/** The setups a take can have, and the one chosen last in this browser: evenings go on with what stands there. */
export function useUploadSetups() {
  const { setups = [] } = useSetups();
  return {
    all: setups,
    /** @param here - what was chosen on this page: an id, empty for none, null for nothing yet */
    chosen: (here: string | null) => chosenSetup(setups, here ?? readLast()),
    remember: writeLast,
  };
}

/** A setup that is not there any more is none. */
const chosenSetup = (setups: readonly SetupListItem[], id: string | null): string | null =>
  setups.find((setup) => setup.id === id)?.id ?? null;

/** A browser may refuse to keep anything. */
function readLast(): string | null {
  try {
    return localStorage.getItem(storageKey);
  } catch {
    return null;
  }
}

function writeLast(setupId: string): void {
  try {
    localStorage.setItem(storageKey, setupId);
  } catch {
    // Then the next take begins without a setup.
  }
}
