import type { NamedSetup, TakeListItem } from '@thudline/contracts';
import { doneWords, type ChosenTake } from '../chosenTakes';
import { useChosenTakes } from './useChosenTakes';
import { useTakeActions } from './useTakeActions';
import { failureWords, useUndo, type Done } from './useUndo';

type Actions = ReturnType<typeof useTakeActions>;

const idsOf = (takes: readonly ChosenTake[]) => takes.map(({ id }) => id);

/**
 * Choosing takes and what is done to them. Deleted ones are chosen among themselves. A page that lost its last row gives
 * way to the first.
 */
export function useTakesBench(
  shown: readonly TakeListItem[],
  { deleted, onPageEmptied }: { deleted: boolean; onPageEmptied?: () => Promise<void> | void },
) {
  const actions = useTakeActions();
  const undo = useUndo();
  const { chosen: everyChosen, isChosen, choose, clear } = useChosenTakes();
  const chosen = everyChosen.filter(({ deletedAt }) => (deletedAt !== null) === deleted);
  const forget = (takes: readonly ChosenTake[]) => takes.forEach((take) => choose(take, false));

  const restore = async (takes: readonly ChosenTake[]) => {
    try {
      await actions.restore(idsOf(takes));
      forget(takes);
      undo.tell({ words: doneWords(takes, 'back'), takesFocus: true });
    } catch (error) {
      undo.tell(deletion(takes, actions), failureWords(error));
    }
  };

  return {
    chosen,
    clear,
    undo,
    actions: {
      isChosen,
      choose,
      setTags: actions.setTags,
      measureAgain: actions.measureAgain,
      restore: (take: TakeListItem) => restore([take]),
    },
    restoreChosen: async () => {
      const emptied = shown.every(isChosen);
      await restore(chosen);
      if (emptied) await onPageEmptied?.();
    },
    /** Offers to undo what was done, also where the rest did not work. */
    removeChosen: async () => {
      const emptied = shown.every(isChosen);
      const { gone, error } = await actions.remove(idsOf(chosen));
      const removed = chosen.filter(({ id }) => gone.includes(id));
      if (removed.length > 0) undo.tell(deletion(removed, actions));
      forget(removed);
      if (error instanceof Error) throw error;
      if (emptied) await onPageEmptied?.();
    },
    setUpChosen: async (setup: NamedSetup) => {
      const before = await actions.setSetup(idsOf(chosen), setup.id);
      undo.tell({
        words: doneWords(chosen, `recorded with ${setup.name}`),
        takeBack: { act: () => actions.setEachSetup(before), words: 'The setups are as they were.' },
      });
    },
    tagChosen: async (tags: string[]) => {
      const before = await actions.addTags(idsOf(chosen), tags);
      undo.tell({
        words: doneWords(chosen, `tagged ${tags.join(', ')}`),
        takeBack: { act: () => actions.setEachTags(before), words: 'The tags are as they were.' },
      });
    },
  };
}

const deletion = (takes: readonly ChosenTake[], { restore }: Actions): Done => ({
  words: doneWords(takes, 'deleted'),
  takesFocus: true,
  takeBack: { act: () => restore(idsOf(takes)), words: doneWords(takes, 'back') },
});
