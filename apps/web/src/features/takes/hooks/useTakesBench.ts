import type { TakeListItem } from '@thudline/contracts';
import { useChosenTakes } from './useChosenTakes';
import { useTakeActions } from './useTakeActions';
import { useUndo } from './useUndo';

/** Choosing takes and what is done to them. A page that lost its last row gives way to the first. */
export function useTakesBench(shown: readonly TakeListItem[], onPageEmptied?: () => Promise<void> | void) {
  const { setTags, addTags, measureAgain } = useTakeActions();
  const undo = useUndo();
  const { chosen, isChosen, choose, clear } = useChosenTakes();
  return {
    chosen,
    clear,
    undo,
    actions: {
      isChosen,
      choose,
      setTags,
      measureAgain,
      restore: (take: TakeListItem) => undo.bringBack([take]),
    },
    removeChosen: async () => {
      const emptied = shown.every(isChosen);
      const { deleted, error } = await undo.remove(chosen);
      deleted.forEach((take) => choose(take, false));
      if (error instanceof Error) throw error;
      if (emptied) await onPageEmptied?.();
    },
    tagChosen: (tags: string[]) =>
      addTags(
        chosen.map(({ id }) => id),
        tags,
      ),
  };
}
